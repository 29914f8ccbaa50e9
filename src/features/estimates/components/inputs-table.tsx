import type { EstimateView } from '#shared/contracts/estimates.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { InputQuantity } from './input-quantity.tsx';
import { lineWord } from './line-words.ts';
import { ReadFrom } from './read-from.tsx';
import { SymbolWord } from './symbol-word.tsx';

type InputsTableProps = {
  estimates: readonly EstimateView[];
  caseNumber: string;
  chosenId: string | null;
  onChosen: (id: string) => void;
};

/** What each line was reckoned from, and where that was read. */
export function InputsTable({ estimates, caseNumber, chosenId, onChosen }: InputsTableProps) {
  return (
    <Table caption="Inputs of the lines in force, with U at k = 2" rows="inputs">
      <thead>
        <tr>
          <Th>Line</Th>
          <Th>Input</Th>
          <Th numeric>
            Value ± <var>U</var>
          </Th>
          <Th>Read from</Th>
        </tr>
      </thead>
      <tbody>
        {estimates.flatMap((estimate) =>
          estimate.inputs.map((input, index) => (
            <tr key={`${estimate.id} ${input.name}`} className={index === 0 ? 'is-first' : undefined}>
              <th scope="row">
                {index === 0 ? (
                  <button
                    type="button"
                    className="font-semibold underline decoration-rule underline-offset-[3px] aria-pressed:decoration-ink aria-pressed:decoration-2"
                    aria-pressed={estimate.id === chosenId}
                    onClick={() => onChosen(estimate.id)}
                  >
                    {lineWord[estimate.line]}
                  </button>
                ) : (
                  <span className="sr-only">{lineWord[estimate.line]}</span>
                )}
              </th>
              <td>
                {input.label} <SymbolWord symbol={input.symbol} />
              </td>
              <td className="num">
                <InputQuantity input={input} stale={input.stale} />
              </td>
              <td>
                <ReadFrom input={input} caseNumber={caseNumber} />
              </td>
            </tr>
          )),
        )}
      </tbody>
    </Table>
  );
}
