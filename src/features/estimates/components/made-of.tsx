import type { BudgetView } from '#shared/contracts/estimates.ts';
import { coverageFactor, formatNumber } from '#shared/wording/quantity.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { SetText } from './set-text.tsx';
import { SymbolWord } from './symbol-word.tsx';

/** What the ± is made of: one ink bar an input, its share of the variance, largest first. */
export function MadeOf({ budget }: { budget: readonly BudgetView[] }) {
  return (
    <Table
      caption="Share of each input in the variance, with its own ± and what it does to the stress, k = 2"
      rows="inputs"
    >
      <thead>
        <tr>
          <Th>Input</Th>
          <Th numeric>±</Th>
          <Th numeric>MPa</Th>
          <Th>Share</Th>
        </tr>
      </thead>
      <tbody>
        {budget.map((row) => (
          <tr key={row.input}>
            <th scope="row" className="!font-normal">
              {row.label} <SymbolWord symbol={row.symbol} />
            </th>
            <td className="num whitespace-nowrap text-ink-2">
              {row.standardUncertainty === 0 ? 'none stated' : <SetText text={row.plusMinus} />}
            </td>
            <td className="num whitespace-nowrap">
              ± {formatNumber(coverageFactor * row.contribution, { decimals: 1 })}
            </td>
            <td className="whitespace-nowrap">
              <ShareBar share={row.share} />
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

const fullBarPx = 60;

function ShareBar({ share }: { share: number }) {
  const ofHundred = share > 0 && share < 0.01 ? 'under 1 of 100' : `${Math.round(100 * share)} of 100`;
  const widthPx = Math.max(1, share * fullBarPx);
  return (
    <span className="inline-flex items-center gap-2">
      <svg width={fullBarPx} height="9" viewBox={`0 0 ${fullBarPx} 9`} aria-hidden>
        <rect width={widthPx} height="9" fill="var(--ink-2)" />
      </svg>
      <span className="whitespace-nowrap text-s text-ink-2">{ofHundred}</span>
    </span>
  );
}
