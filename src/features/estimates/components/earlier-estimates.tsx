import type { EstimateView } from '#shared/contracts/estimates.ts';
import { formatShortDay } from '#shared/wording/dates.ts';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { lineWord } from './line-words.ts';

type EarlierEstimatesProps = { estimates: readonly EstimateView[]; onChosen: (id: string) => void };

/** Estimates that are superseded or set aside: kept, shown, and not compared. */
export function EarlierEstimates({ estimates, onChosen }: EarlierEstimatesProps) {
  const earlier = estimates.filter((each) => !each.isCompared);
  if (earlier.length === 0) return null;
  return (
    <section className="mt-6" aria-label="Earlier and set aside">
      <RuleHead small aside="kept, not compared">
        Earlier and set aside
      </RuleHead>
      <Table caption="Estimates that are superseded or set aside" rows="inputs">
        <thead>
          <tr>
            <Th>Estimate</Th>
            <Th>Line</Th>
            <Th numeric>
              Stress ± <var>U</var>
            </Th>
            <Th>Why it is not compared</Th>
          </tr>
        </thead>
        <tbody>
          {earlier.map((estimate) => (
            <tr key={estimate.id} className="text-ink-2">
              <th scope="row">
                <button
                  type="button"
                  className="underline decoration-rule underline-offset-[3px]"
                  onClick={() => onChosen(estimate.id)}
                >
                  {estimate.number}, {formatShortDay(estimate.madeAt)}
                </button>
              </th>
              <td>{lineWord[estimate.line]}</td>
              <td className="num whitespace-nowrap">{estimate.origin.text}</td>
              <td>{whyNotCompared(estimate, estimates)}</td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}

function whyNotCompared(estimate: EstimateView, all: readonly EstimateView[]): string {
  if (estimate.supersededById !== null) {
    const later = all.find((each) => each.id === estimate.supersededById);
    return `made again as estimate ${later?.number ?? ''}`;
  }
  if (estimate.standing.standing === 'set aside') return `set aside: ${estimate.standing.reason}`;
  return `a newer one of the ${estimate.line} line is compared`;
}
