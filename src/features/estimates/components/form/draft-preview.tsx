import type { DraftPreview } from './preview.ts';
import { estimatedParts } from '#shared/wording/quantity.ts';
import { Quantity } from '#src/ui/quantity.tsx';

/** What the draft would give, worked here as it is typed; nothing is kept yet. */
export function DraftStress({ preview }: { preview: DraftPreview }) {
  const { reckoned, hindrance } = preview;
  return (
    <div className="border-y border-rule py-3" aria-live="polite">
      <p className="eyebrow">Stress at the origin, not kept yet</p>
      {reckoned ? (
        <>
          <p className="text-[28px]/[1.3]">
            <Quantity {...estimatedParts(reckoned.origin)} strong />
          </p>
          {reckoned.cautions.map((caution) => (
            <p key={caution.code} className="text-s text-ink-2">
              {caution.sentence}
            </p>
          ))}
        </>
      ) : (
        <p className="text-ink-2">{hindrance}</p>
      )}
    </div>
  );
}
