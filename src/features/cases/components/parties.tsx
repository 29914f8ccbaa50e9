import type { CaseView } from '#shared/contracts/cases.ts';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Table } from '#src/ui/table.tsx';

/** Who asks, who works on it, and what each may see. */
export function Parties({ view, laboratory }: { view: CaseView; laboratory: string }) {
  const seen = view.restricted
    ? `only ${view.namedPeople.map(({ name }) => name).join(', ')}`
    : 'all staff of the laboratory see it';
  return (
    <section>
      <RuleHead>Who is party to it</RuleHead>
      <Table caption="Parties" stacked>
        <tbody>
          <tr>
            <td>{view.organisation.name}</td>
            <td className="is-wide text-ink-2">asks</td>
            <td className="is-wide text-ink-2">sees the state in plain words, and what is released</td>
          </tr>
          <tr>
            <td>{laboratory}</td>
            <td className="is-wide text-ink-2">{view.assignedTo?.name ?? 'no one yet'}</td>
            <td className="is-wide text-ink-2">{seen}</td>
          </tr>
        </tbody>
      </Table>
    </section>
  );
}
