import type { EstimateView } from '#shared/contracts/estimates.ts';
import type { Answer } from '#shared/rules/may.ts';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { BarDrawing } from './bar/bar-drawing.tsx';
import { barOf } from './bar/bar-facts.ts';
import { lineWord } from './line-words.ts';
import { MadeOf } from './made-of.tsx';
import { Remarks } from './remarks.tsx';
import { SetText } from './set-text.tsx';
import { StandingActs } from './standing-acts.tsx';

type EstimateDetailProps = {
  estimate: EstimateView;
  caseNumber: string;
  mayEstimate: Answer;
  onMakeAgain: () => void;
};

/** One estimate laid open: formula with numbers, the bar it was worked on, what its ± is made of, and remarks. */
export function EstimateDetail({ estimate, caseNumber, mayEstimate, onMakeAgain }: EstimateDetailProps) {
  const bar = barOf(estimate);
  const isHead = estimate.supersededById === null;
  return (
    <section aria-label={`Estimate ${estimate.number} laid open`} className="mt-6">
      <RuleHead small aside={estimate.method.title}>
        {lineWord[estimate.line]}, estimate {estimate.number}
      </RuleHead>
      <p className="scroll-x my-2 border-b border-rule pb-3 text-m tabular-nums">
        <var>σ</var> = <SetText text={`${estimate.method.symbols} = ${estimate.formula}`} />
      </p>
      {bar ? <BarDrawing bar={bar} /> : null}
      <div className="mt-4 grid gap-x-8 gap-y-5 min-[1240px]:grid-cols-[minmax(0,7fr)_minmax(0,5fr)]">
        <div className="min-w-0">
          <RuleHead small>What the ± is made of</RuleHead>
          <MadeOf budget={estimate.budget} />
        </div>
        <div className="min-w-0">
          <RuleHead small>Remarks</RuleHead>
          <Remarks estimate={estimate} />
        </div>
      </div>
      {isHead && mayEstimate.allowed ? (
        <div className="acts mt-3">
          <button type="button" className="button is-small" onClick={onMakeAgain}>
            Make estimate {estimate.number} again
          </button>
          <StandingActs key={estimate.id + estimate.standing.standing} estimate={estimate} caseNumber={caseNumber} />
        </div>
      ) : null}
    </section>
  );
}
