import type { ReactNode } from 'react';
import type { CasebookOrder, CasebookQuery, StaffRow } from '#shared/contracts/casebook.ts';
import { daysBetween } from '#shared/wording/dates.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { CasebookTableRow } from './casebook-row.tsx';

type CasebookTableProps = {
  rows: readonly StaffRow[];
  asOf: string;
  query: CasebookQuery;
  personId: string;
  /** What stands under "Lines of evidence"; the rows know nothing of estimates. */
  linesOf: (number: string) => ReactNode;
  onOrder: (order: CasebookOrder) => void;
};

/** The cases of the laboratory: origin, number, what broke, and how it stands. */
export function CasebookTable({ rows, asOf, query, personId, linesOf, onOrder }: CasebookTableProps) {
  const oldestDays = Math.max(0, ...rows.map((row) => daysBetween(row.receivedAt, row.closedAt ?? asOf)));
  const head = (order: CasebookOrder) => ({
    sorted: query.order === order ? query.direction : ('none' as const),
    onSort: () => onOrder(order),
  });
  return (
    <Table caption="Cases" rows="casebook" stacked pictures>
      <thead>
        <tr>
          <Th hidden>Origin</Th>
          <Th {...head('number')}>Case</Th>
          <Th {...head('title')}>Part, and what happened</Th>
          <Th {...head('material')} className="max-[1240px]:hidden">
            Material
          </Th>
          <Th {...head('state')}>State</Th>
          <Th {...head('age')}>Age</Th>
          <Th>With</Th>
          <Th>Origin</Th>
          <Th>Lines of evidence</Th>
          <Th hidden>Margin: what is stale</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <CasebookTableRow key={row.number} {...{ row, asOf, oldestDays, personId }} lines={linesOf(row.number)} />
        ))}
      </tbody>
    </Table>
  );
}
