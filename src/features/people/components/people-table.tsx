import type { AccountView, OrganisationView } from '#shared/contracts/people.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

type PeopleTableProps = {
  organisations: readonly OrganisationView[];
  accounts: readonly AccountView[];
  onChosen: (account: AccountView) => void;
  /** How an instant stands in a column. */
  when: (iso: string) => string;
};

const kindOrder = ['laboratory', 'maker', 'outside'];

/** Every account, by organisation: the laboratory first, then makers, then outside firms. */
export function PeopleTable({ organisations, accounts, onChosen, when }: PeopleTableProps) {
  const ordered = [...organisations].sort((one, other) => kindOrder.indexOf(one.kind) - kindOrder.indexOf(other.kind));
  return (
    <Table caption="People by organisation">
      <thead>
        <tr>
          <Th>Account</Th>
          <Th>Roles</Th>
          <Th>State</Th>
          <Th numeric>Last here</Th>
        </tr>
      </thead>
      {ordered.map((organisation) => (
        <tbody key={organisation.id}>
          <tr>
            <th colSpan={4} scope="rowgroup" className="pt-3! font-serif font-medium!">
              {organisation.name}{' '}
              <span className="ml-1 font-serif text-s font-normal text-ink-3 italic">{organisation.kind}</span>
            </th>
          </tr>
          {accounts
            .filter((account) => account.organisationId === organisation.id)
            .map((account) => (
              <tr key={account.id}>
                <td className="py-1">
                  <button
                    type="button"
                    className="text-left underline decoration-rule underline-offset-3"
                    onClick={() => onChosen(account)}
                  >
                    {account.name}
                  </button>
                  <span className="block text-s break-all text-ink-2">{account.mail}</span>
                </td>
                <td className="text-ink-2">{account.roles.join(', ')}</td>
                <td className={account.state === 'closed' ? 'font-semibold' : 'text-ink-2'}>{account.state}</td>
                <td className="num whitespace-nowrap text-ink-2">
                  {account.lastHereAt ? when(account.lastHereAt) : 'never'}
                </td>
              </tr>
            ))}
        </tbody>
      ))}
    </Table>
  );
}
