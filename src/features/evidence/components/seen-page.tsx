import type { CaseAnswer } from '#shared/contracts/cases.ts';
import type { EvidenceView } from '#shared/contracts/evidence.ts';
import { Caution } from '#src/ui/caution.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { cautionsFor } from './cautions.ts';
import type { FacePicture } from './face-pictures.ts';
import { MatePairs } from './mate-pairs.tsx';
import { MissingLedger } from './missing-ledger.tsx';
import { PartFacts } from './part-facts.tsx';
import { OfferMaterial } from './offer-material.tsx';
import type { MaterialOffered } from './part-form.tsx';

type SeenPageProps = {
  number: string;
  evidence: EvidenceView;
  materials: readonly MaterialOffered[];
  pictures: readonly FacePicture[];
  /** The case, once it is read, for the material it names. */
  caseSeen: CaseAnswer | undefined;
};

/** The left page of the chapter: what broke, what is not there, which faces belong together, and what to mind. */
export function SeenPage({ number, evidence, materials, pictures, caseSeen }: SeenPageProps) {
  const { parts, pieces, mates, change } = evidence;
  return (
    <>
      {parts.length === 0 ? (
        <div className="mb-5">
          <RuleHead>What broke</RuleHead>
          <p className="mt-2 text-ink-2">Nothing is entered yet.</p>
        </div>
      ) : null}
      {parts.map((part) => (
        <PartFacts key={part.id} number={number} part={part} mayChange={change.allowed} materials={materials} />
      ))}
      {change.allowed ? <OfferMaterial number={number} parts={parts} caseSeen={caseSeen} /> : null}
      {parts.length > 0 ? <MissingLedger pieces={pieces} /> : null}
      {pieces.length > 1 ? (
        <MatePairs number={number} mates={mates} pictures={pictures} mayChange={change.allowed} />
      ) : null}
      <div className="mt-2 flex flex-col gap-3">
        {cautionsFor(parts).map(({ lead, text }) => (
          <Caution key={lead} lead={lead}>
            {text}
          </Caution>
        ))}
      </div>
    </>
  );
}
