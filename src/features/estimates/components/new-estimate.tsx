import type { Answer } from '#shared/rules/may.ts';
import { estimateLines, type EstimateLine } from '#shared/vocabulary/estimate-lines.ts';

type NewEstimateProps = { mayEstimate: Answer; onMake: (line: EstimateLine) => void };

/** The way to a new estimate of each line, or why there is none. */
export function NewEstimate({ mayEstimate, onMake }: NewEstimateProps) {
  if (!mayEstimate.allowed) return <p className="screen-only mt-3 text-s text-ink-2">{mayEstimate.reason}</p>;
  return (
    <div className="acts mt-3">
      {estimateLines.map((line) => (
        <button key={line} type="button" className="button is-small" onClick={() => onMake(line)}>
          Estimate by the {line}
        </button>
      ))}
    </div>
  );
}
