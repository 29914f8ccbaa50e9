import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { AccountView } from '#shared/contracts/people.ts';
import { whenWords } from '../../features/laboratory/components/when.ts';
import { peopleQuery } from '../../features/people/api.ts';
import { AccountDialog } from '../../features/people/components/account-dialog.tsx';
import { InvitationsTable } from '../../features/people/components/invitations-table.tsx';
import { InviteDialog } from '../../features/people/components/invite-dialog.tsx';
import { OrganisationsList } from '../../features/people/components/organisations-list.tsx';
import { PeopleTable } from '../../features/people/components/people-table.tsx';
import { Button } from '../../ui/button.tsx';
import { ErrorState } from '../../ui/error-state.tsx';
import { LoadingState } from '../../ui/loading-state.tsx';
import { Page } from '../../ui/page.tsx';
import { RuleHead } from '../../ui/rule-head.tsx';
import { Spread } from '../../ui/spread.tsx';

/** Accounts by organisation at the left; invitations and organisations at the right. */
export function Component() {
  const people = useQuery(peopleQuery);
  const [inviting, setInviting] = useState(false);
  const [edited, setEdited] = useState<AccountView | null>(null);
  const [now] = useState(() => new Date());
  const when = (iso: string) => whenWords(iso, now);
  if (people.isPending) return <LoadingState words="Reading who is here…" />;
  if (people.isError) return <ErrorState what="The people could not be read." why={people.error.message} />;
  const { organisations, accounts } = people.data;
  const invited = accounts.filter(({ state }) => state === 'invited').length;
  return (
    <>
      <Spread>
        <Page label="People" folio={{ chapter: 'i', words: 'People', side: 'left' }}>
          <RuleHead level={2} aside={`${accounts.length} accounts in ${organisations.length} organisations`}>
            People
          </RuleHead>
          <PeopleTable organisations={organisations} accounts={accounts} onChosen={setEdited} when={when} />
          <div className="acts mt-4 mb-3">
            <Button kind="main" onClick={() => setInviting(true)}>
              Invite someone
            </Button>
          </div>
          <p className="text-s text-ink-2">
            A closed account loses its sessions at once; its signatures stay. No role here can change a finding.
          </p>
        </Page>
        <Page
          label="Invitations and organisations"
          folio={{ chapter: 'i', words: 'Invitations and organisations', side: 'right' }}
        >
          <RuleHead level={2} aside={`${invited} open`}>
            Invitations
          </RuleHead>
          <InvitationsTable accounts={accounts} onCorrect={setEdited} when={when} now={now} />
          <div className="mt-7">
            <RuleHead level={2} aside="each apart from the others">
              Organisations
            </RuleHead>
            <OrganisationsList organisations={organisations} />
          </div>
        </Page>
      </Spread>
      <InviteDialog open={inviting} onOpenChange={setInviting} organisations={organisations} />
      <AccountDialog account={edited} onClose={() => setEdited(null)} organisations={organisations} />
    </>
  );
}
