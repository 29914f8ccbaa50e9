import type { ConstantView } from '#shared/contracts/materials.ts';
import { constantKindTable, type ConstantKind } from '#shared/vocabulary/constant-kinds.ts';
import { constantParts } from '#shared/wording/constant.ts';
import { formatDay, formatShortDay } from '#shared/wording/dates.ts';
import { asSentence, counted } from '#shared/wording/number-words.ts';
import { FigureCaption } from '#src/ui/figure-caption.tsx';
import { Quantity } from '#src/ui/quantity.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { recordsOverTime } from '../records-over-time.ts';
import { ConstantSymbol } from './constant-symbol.tsx';
import { RecordsChart } from './records-chart.tsx';

type RecordsOfKindProps = { kind: ConstantKind; records: readonly ConstantView[]; today: string };

/** Every record of one constant: over time, and as a table with source, reason and who made it. */
export function RecordsOfKind({ kind, records, today }: RecordsOfKindProps) {
  return (
    <section>
      <RuleHead aside={counted(records.length, 'record')}>
        {asSentence(constantKindTable[kind].word)} <ConstantSymbol kind={kind} />
      </RuleHead>
      {records.length === 0 ? (
        <p className="py-2 text-ink-2">No record yet. An estimate that needs it waits for the first.</p>
      ) : (
        <>
          <figure>
            <RecordsChart spans={recordsOverTime(records, today)} />
            <FigureCaption number="Fig. 1">
              Each record for as long as it was in force, ± <var>U</var> (<var>k</var> = 2).
            </FigureCaption>
          </figure>
          <details className="mt-1">
            <summary className="text-s text-cobalt underline underline-offset-[3px]">Read as a table</summary>
            <Table caption={`Records of ${constantKindTable[kind].word}`} className="mt-1">
              <thead>
                <tr>
                  <Th numeric>Record</Th>
                  <Th numeric>
                    Value ± <var>U</var>
                  </Th>
                  <Th>Source</Th>
                  <Th>From</Th>
                  <Th>Kept by</Th>
                </tr>
              </thead>
              <tbody>
                {records.map((record) => (
                  <tr key={record.id}>
                    <td className="num">{record.recordNumber}</td>
                    <td className="num whitespace-nowrap">
                      <Quantity {...constantParts(record)} strong={record.supersededById === null} />
                    </td>
                    <td className="py-1 text-s leading-[1.3] text-ink-2">
                      {record.source}
                      <span className="block">
                        typed as {record.enteredText}
                        {record.reason ? `; ${record.reason}` : ''}
                      </span>
                    </td>
                    <td className="whitespace-nowrap text-ink-2">{formatShortDay(record.validFrom, 0)}</td>
                    <td className="text-s text-ink-2">
                      {record.madeBy.name}, {formatDay(record.madeAt)}
                    </td>
                  </tr>
                ))}
              </tbody>
            </Table>
          </details>
        </>
      )}
    </section>
  );
}
