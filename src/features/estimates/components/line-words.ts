import type { EstimateView } from '#shared/contracts/estimates.ts';
import type { EstimateLine } from '#shared/vocabulary/estimate-lines.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import type { EvidenceLine } from './evidence-line.ts';

export const lineWord: Readonly<Record<EstimateLine, string>> = { load: 'Load', mirror: 'Mirror', flaw: 'Flaw' };

/** What a line was read from, in a few words under its name: "bend, 40/20 mm", "m3, Fig. 2". */
export function readFromWords(estimate: EstimateView): string {
  const spans = ['outerSpan', 'innerSpan'].flatMap((name) => {
    const span = estimate.inputs.find((input) => input.name === name);
    return span ? [formatNumber(span.value)] : [];
  });
  if (spans.length > 0) return `bend, ${spans.join('/')} mm`;
  const reading = estimate.inputs.find((input) => input.source.kind === 'measurement')?.source;
  if (reading?.kind === 'measurement') return `m${reading.markNumber}, Fig. ${reading.figureNumber}`;
  return 'typed';
}

/** The three lines for the chart: those compared, those set aside where none is, and those not reckoned. */
export function evidenceLines(estimates: readonly EstimateView[]): EvidenceLine[] {
  return (['load', 'mirror', 'flaw'] as const).map((line) => {
    const standing = estimates.filter((each) => each.line === line && each.supersededById === null);
    const estimate = standing.find((each) => each.isCompared) ?? standing.at(-1);
    if (!estimate) return { line, label: lineWord[line], sublabel: '', value: null, expandedUncertainty: 0 };
    return {
      line,
      label: lineWord[line],
      sublabel: readFromWords(estimate),
      value: estimate.origin.value,
      expandedUncertainty: estimate.origin.expandedUncertainty,
      stale: estimate.stale !== null,
      setAside: !estimate.isCompared,
    };
  });
}
