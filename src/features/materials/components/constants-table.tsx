import type { ConstantView } from '#shared/contracts/materials.ts';
import { constantKinds, constantKindTable, type ConstantKind } from '#shared/vocabulary/constant-kinds.ts';
import { constantParts } from '#shared/wording/constant.ts';
import { formatShortDay } from '#shared/wording/dates.ts';
import { asSentence } from '#shared/wording/number-words.ts';
import { Quantity } from '#src/ui/quantity.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { ConstantSymbol } from './constant-symbol.tsx';
import { SourceWord } from './source-word.tsx';

type ConstantsTableProps = {
  /** Those that held on the day, one a kind. */
  constants: readonly ConstantView[];
  chosen: ConstantKind;
  onChosen: (kind: ConstantKind) => void;
};

/** The constants as they stood on a day; a kind without a record says so. */
export function ConstantsTable({ constants, chosen, onChosen }: ConstantsTableProps) {
  return (
    <Table caption="Constants in force">
      <thead>
        <tr>
          <Th>Constant, and how it was found</Th>
          <Th numeric>
            Value ± <var>U</var>
          </Th>
          <Th>Source</Th>
          <Th numeric>In force from</Th>
        </tr>
      </thead>
      <tbody>
        {constantKinds.map((kind) => {
          const constant = constants.find((each) => each.kind === kind);
          return (
            <tr key={kind} aria-selected={kind === chosen}>
              <th scope="row" className="!py-1 leading-[1.25] !font-semibold">
                <button
                  type="button"
                  className="text-left underline decoration-rule underline-offset-[3px]"
                  onClick={() => onChosen(kind)}
                >
                  {asSentence(constantKindTable[kind].word)} <ConstantSymbol kind={kind} />
                </button>
                {constant?.condition ? (
                  <span className="block text-s font-normal text-ink-2">{constant.condition}</span>
                ) : null}
              </th>
              <td className="num whitespace-nowrap">
                {constant ? <Quantity {...constantParts(constant)} /> : <span className="text-ink-3">none yet</span>}
              </td>
              <td>{constant ? <SourceWord standing={constant.sourceStanding} /> : null}</td>
              <td className="num whitespace-nowrap text-ink-2">
                {constant ? formatShortDay(constant.validFrom, 0) : null}
              </td>
            </tr>
          );
        })}
      </tbody>
    </Table>
  );
}
