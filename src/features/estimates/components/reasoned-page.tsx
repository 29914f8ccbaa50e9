import { useState } from 'react';
import type { EstimatesView, EstimateView } from '#shared/contracts/estimates.ts';
import type { Answer } from '#shared/rules/may.ts';
import { estimateLines, type EstimateLine } from '#shared/vocabulary/estimate-lines.ts';
import { Caution } from '#src/ui/caution.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { WithMargin } from '#src/ui/with-margin.tsx';
import { EarlierEstimates } from './earlier-estimates.tsx';
import { EstimateDetail } from './estimate-detail.tsx';
import { EstimateForm } from './form/estimate-form.tsx';
import { InputsTable } from './inputs-table.tsx';
import { evidenceLines } from './line-words.ts';
import { LineageTree } from './lineage-tree.tsx';
import { LinesOfEvidence } from './lines-of-evidence.tsx';
import { NewEstimate } from './new-estimate.tsx';
import { StaleLine } from './stale-line.tsx';
import { VerdictSentence } from './verdict-sentence.tsx';

type ReasonedPageProps = {
  caseNumber: string;
  view: EstimatesView;
  materialId: string | null;
  mayEstimate: Answer;
};

type Making = { line: EstimateLine; again: EstimateView | null };

/** What was reasoned: the lines of evidence, the verdict, what each rests on, and the way to a new one. */
export function ReasonedPage({ caseNumber, view, materialId, mayEstimate }: ReasonedPageProps) {
  const [making, setMaking] = useState<Making | null>(null);
  const [chosenId, setChosenId] = useState<string | null>(null);
  const done = (made: EstimateView | null) => {
    setMaking(null);
    if (made) setChosenId(made.id);
  };
  if (making) return <EstimateForm {...{ caseNumber, materialId, ...making }} onDone={done} />;
  const { estimates, agreement } = view;
  const make = (line: EstimateLine) => setMaking({ line, again: null });
  if (estimates.length === 0) return <NoEstimates mayEstimate={mayEstimate} onMake={make} />;
  const compared = inLineOrder(estimates.filter((each) => each.isCompared));
  const heads = inLineOrder(estimates.filter((each) => each.supersededById === null));
  const chosen = estimates.find((each) => each.id === chosenId) ?? toLookAt(compared) ?? estimates.at(-1);
  const stale = heads.filter((each) => each.stale !== null);
  const lines = (
    <>
      <RuleHead aside={asideOf(compared.length)}>Stress at the origin</RuleHead>
      <LinesOfEvidence rows={evidenceLines(estimates)} />
    </>
  );
  const verdict = <VerdictSentence agreement={agreement} />;
  const inputs = (
    <InputsTable estimates={heads} caseNumber={caseNumber} chosenId={chosen?.id ?? null} onChosen={setChosenId} />
  );
  const lineage = chosen ? <LineageTree estimate={chosen} /> : null;
  return (
    <>
      {stale.length > 0 ? (
        <WithMargin
          margin={
            <div className="grid gap-4 min-[641px]:pt-7">
              {stale.map((each) => (
                <StaleLine key={each.id} estimate={each} {...{ caseNumber, mayEstimate }} />
              ))}
              {lineage}
            </div>
          }
        >
          {lines}
          {verdict}
          {inputs}
        </WithMargin>
      ) : (
        <>
          <WithMargin margin={null}>{lines}</WithMargin>
          {verdict}
          <WithMargin margin={lineage} className="mt-3">
            {inputs}
          </WithMargin>
        </>
      )}
      <NewEstimate mayEstimate={mayEstimate} onMake={make} />
      {chosen ? (
        <EstimateDetail
          estimate={chosen}
          {...{ caseNumber, mayEstimate }}
          onMakeAgain={() => setMaking({ line: chosen.line, again: chosen })}
        />
      ) : null}
      <EarlierEstimates estimates={estimates} onChosen={setChosenId} />
      <div className="mt-6">
        <EstimateCaution />
      </div>
    </>
  );
}

/** In the order load, mirror, flaw, then by number. */
function inLineOrder(estimates: readonly EstimateView[]): EstimateView[] {
  const place = (each: EstimateView) => estimateLines.indexOf(each.line);
  return [...estimates].sort((one, other) => place(one) - place(other) || one.number - other.number);
}

/** The line laid open first: a stale one, else the sharpest. */
function toLookAt(compared: readonly EstimateView[]): EstimateView | undefined {
  const sharpness = (each: EstimateView) => each.origin.expandedUncertainty / Math.abs(each.origin.value);
  const bySharpness = [...compared].sort((one, other) => sharpness(one) - sharpness(other));
  return compared.find((each) => each.stale !== null) ?? bySharpness[0];
}

function asideOf(count: number): string {
  return (
    ['no line of evidence', 'one line of evidence', 'two lines of evidence', 'three lines of evidence'][count] ?? ''
  );
}

function NoEstimates({ mayEstimate, onMake }: { mayEstimate: Answer; onMake: (line: EstimateLine) => void }) {
  return (
    <>
      <RuleHead aside="three lines of evidence">Stress at the origin</RuleHead>
      <EmptyState acts={<NewEstimate mayEstimate={mayEstimate} onMake={onMake} />}>
        Nothing has been reckoned yet. Begin with the line you trust most: load, mirror or flaw.
      </EmptyState>
      <EstimateCaution />
    </>
  );
}

function EstimateCaution() {
  return (
    <Caution>
      An estimate about a broken piece, with stated limits. Not an allowable for design and not leave to use other
      parts. Fitness for use, recall, treatment and legal duty to report are decided by the responsible licensed
      professionals under local codes.
    </Caution>
  );
}
