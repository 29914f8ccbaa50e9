import type { CaseAnswer } from '#shared/contracts/cases.ts';
import type { PartView } from '#shared/contracts/evidence.ts';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { useCaseMaterial } from '../api.ts';

type OfferMaterialProps = { number: string; parts: readonly PartView[]; caseSeen: CaseAnswer | undefined };

/** Where a part has a material and the case has none: offers to take it for the case, which estimates read. */
export function OfferMaterial({ number, parts, caseSeen }: OfferMaterialProps) {
  const { mutate, isPending, error } = useCaseMaterial(number);
  const material = parts.find((part) => part.material !== null)?.material;
  if (!material || caseSeen?.seenAs !== 'laboratory' || caseSeen.material !== null) return null;
  return (
    <Note
      className="mb-5"
      lead="The case names no material yet."
      acts={
        <Button
          small
          disabled={isPending}
          onClick={() => mutate({ materialId: material.id, versionSeen: caseSeen.version })}
        >
          Take {material.name} for the case
        </Button>
      }
    >
      {error ? error.message : 'Estimates take their constants from the material of the case.'}
    </Note>
  );
}
