import type { NumberRow } from '#shared/contracts/casebook.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { StateWord } from './state-word.tsx';

/** Numbers and states: all that an administrator sees of a case. */
export function NumbersTable({ rows }: { rows: readonly NumberRow[] }) {
  return (
    <Table caption="Case numbers and states" stacked>
      <thead>
        <tr>
          <Th>Case</Th>
          <Th>State</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.number}>
            <td className="mono">{row.number}</td>
            <td>
              <StateWord state={row.state} holdUntil={row.holdUntil} />
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
