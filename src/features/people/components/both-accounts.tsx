import type { AccountView, Invitation, OrganisationView } from '#shared/contracts/people.ts';
import { Button } from '#src/ui/button.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

type BothAccountsProps = {
  theirs: AccountView;
  yours: Invitation;
  organisations: readonly OrganisationView[];
  onKeepMine: () => void;
  onTakeTheirs: () => void;
};

/** Both versions of an account changed twice at once, bold where they differ. */
export function BothAccounts({ theirs, yours, organisations, onKeepMine, onTakeTheirs }: BothAccountsProps) {
  const nameOf = (id: string) => organisations.find((one) => one.id === id)?.name ?? '';
  const rows = [
    { word: 'Name', theirs: theirs.name, yours: yours.name },
    { word: 'Mail address', theirs: theirs.mail, yours: yours.mail },
    { word: 'Organisation', theirs: nameOf(theirs.organisationId), yours: nameOf(yours.organisationId) },
    { word: 'Roles', theirs: listed(theirs.roles), yours: listed(yours.roles) },
  ];
  return (
    <div role="alert" className="mt-2 mb-4 border-b border-rule pb-4">
      <p className="mb-2">This account was changed while you wrote. Both stand below; yours is not kept yet.</p>
      <Table caption="Both versions of the account">
        <thead>
          <tr>
            <Th hidden>Field</Th>
            <Th>Theirs</Th>
            <Th>Yours</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.word} className={row.theirs === row.yours ? undefined : 'font-semibold'}>
              <th scope="row">{row.word}</th>
              <td>{row.theirs}</td>
              <td>{row.yours}</td>
            </tr>
          ))}
        </tbody>
      </Table>
      <div className="acts mt-3">
        <Button small onClick={onKeepMine}>
          Go on with mine
        </Button>
        <Button small onClick={onTakeTheirs}>
          Take theirs
        </Button>
      </div>
    </div>
  );
}

const listed = (roles: readonly string[]) => [...roles].sort().join(', ');
