import type { AccountView } from '#shared/contracts/people.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { usePeopleActs } from '../api.ts';

type InvitationsTableProps = {
  accounts: readonly AccountView[];
  onCorrect: (account: AccountView) => void;
  when: (iso: string) => string;
  now: Date;
};

/** The invitations nobody has accepted yet, with what became of their mail. */
export function InvitationsTable({ accounts, onCorrect, when, now }: InvitationsTableProps) {
  const { inviteAgain, takeBack } = usePeopleActs();
  const invited = accounts.filter(({ state }) => state === 'invited');
  const busy = inviteAgain.isPending || takeBack.isPending;
  const error = inviteAgain.error ?? takeBack.error;
  if (invited.length === 0) return <p className="mt-2 text-ink-2">Nobody is invited at the moment.</p>;
  return (
    <>
      <Table caption="Invitations open" stacked>
        <thead>
          <tr>
            <Th>To</Th>
            <Th>What became of it</Th>
            <Th hidden>Acts</Th>
          </tr>
        </thead>
        <tbody>
          {invited.map((account) => (
            <tr key={account.id}>
              <td className="py-1">
                {account.mail}
                <span className="block text-s text-ink-2">{account.roles.join(', ')}</span>
              </td>
              <td className="is-wide">{fateOf(account, when, now)}</td>
              <td className="is-wide">
                <span className="acts justify-end gap-x-3! narrow:justify-start">
                  {account.invitation?.mail === 'came back' ? (
                    <Button kind="plain" small onClick={() => onCorrect(account)}>
                      Correct it
                    </Button>
                  ) : (
                    <Button kind="plain" small disabled={busy} onClick={() => inviteAgain.mutate(account.id)}>
                      Send again
                    </Button>
                  )}
                  <Button kind="plain" small disabled={busy} onClick={() => takeBack.mutate(account.id)}>
                    Take back
                  </Button>
                </span>
              </td>
            </tr>
          ))}
        </tbody>
      </Table>
      {error ? <FieldError id="invitations-error">{error.message}</FieldError> : null}
    </>
  );
}

function fateOf({ invitation }: AccountView, when: (iso: string) => string, now: Date) {
  if (!invitation) return <b className="text-iron">no link; send it again</b>;
  if (invitation.mail === 'came back')
    return <b className="text-iron">came back{invitation.fault ? `: ${invitation.fault}` : ''}</b>;
  if (new Date(invitation.endsAt) <= now) return <b className="text-iron">ran out {when(invitation.endsAt)}</b>;
  const words = invitation.mail === 'waiting' ? 'waits to be sent' : `sent ${when(invitation.sentAt)}`;
  return <span className="text-ink-2">{`${words}, holds until ${when(invitation.endsAt)}`}</span>;
}
