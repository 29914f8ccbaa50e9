import { Link } from 'react-router-dom';
import type { FollowedRow } from '#shared/contracts/casebook.ts';
import { formatDay } from '#shared/wording/dates.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

/** What the requester's organisation asked, and how far the answer has come, in plain words with a day. */
export function RequestsTable({ rows }: { rows: readonly FollowedRow[] }) {
  return (
    <Table caption="My requests" stacked>
      <thead>
        <tr>
          <Th>Case</Th>
          <Th>What was sent</Th>
          <Th>How far it is</Th>
          <Th>Since</Th>
          <Th>Received</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.number}>
            <td className="mono">
              <Link to={`/cases/${row.number}`}>{row.number}</Link>
            </td>
            <td className="is-wide font-semibold">{row.title}</td>
            <td>{row.plainState}</td>
            <td data-word="since">{formatDay(row.stateSince)}</td>
            <td data-word="received" className="text-ink-2">
              {formatDay(row.receivedAt)}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
