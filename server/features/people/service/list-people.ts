import type { PeopleView, StaffView } from '#shared/contracts/people.ts';
import type { Context } from '../../../http/context.ts';
import { lastMails } from '../../../mail/last-mails.ts';
import { presentAccount, presentOrganisation } from '../present.ts';
import { listPeople } from '../queries.ts';
import { listOpenInvitations } from '../queries/one-time-links.ts';
import { listOrganisations } from '../queries/organisations.ts';
import { invitationSubject } from './invitations.ts';

/** Every organisation and every account, with the invitations still open and what became of their mail. */
export async function listAccounts({ reader }: Pick<Context, 'reader'>): Promise<PeopleView> {
  const [organisations, rows, invitations] = await Promise.all([
    listOrganisations(reader),
    listPeople(reader),
    listOpenInvitations(reader),
  ]);
  const invited = rows.filter((row) => row.state === 'invited');
  const mails = await lastMails(
    reader,
    invitationSubject,
    invited.map((row) => row.mail),
  );
  return {
    organisations: organisations.map(presentOrganisation),
    accounts: rows.map((row) =>
      row.state === 'invited'
        ? presentAccount(row, invitations.get(row.id), mails.get(row.mail.toLowerCase()))
        : presentAccount(row),
    ),
  };
}

/** The laboratory's own people with an open account, by name. */
export async function listStaff({ reader }: Pick<Context, 'reader'>): Promise<StaffView> {
  const rows = await listPeople(reader);
  return rows
    .filter((row) => row.state === 'open' && row.organisationKind === 'laboratory')
    .map(({ id, name, roles }) => ({ id, name, roles }))
    .sort((one, other) => one.name.localeCompare(other.name));
}

/** Every organisation, by name. */
export async function listEnteredOrganisations({ reader }: Pick<Context, 'reader'>) {
  return (await listOrganisations(reader)).map(presentOrganisation);
}
