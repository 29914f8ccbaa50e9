import type {
  AccountView,
  LinkView,
  OrganisationView,
  OwnView,
  Person,
  PersonSettings,
} from '#shared/contracts/people.ts';
import type { OpenInvitation } from './queries/one-time-links.ts';
import type { OrganisationRow } from './queries/organisations.ts';
import type { PersonRow } from './queries.ts';

export function presentPerson(row: PersonRow): Person {
  const { id, name, mail, organisationId, organisationName, organisationKind, roles } = row;
  return { id, name, mail, organisationId, organisationName, organisationKind, roles };
}

export function presentSettings(row: PersonRow): PersonSettings {
  const { theme, roomyRows, letterKeys } = row;
  return { theme, roomyRows, letterKeys };
}

type LastMail = { state: 'waiting' | 'gone' | 'came back'; fault: string | null };

export function presentAccount(row: PersonRow, invitation?: OpenInvitation, mail?: LastMail): AccountView {
  return {
    ...presentPerson(row),
    state: row.state,
    lastHereAt: row.lastHereAt?.toISOString() ?? null,
    version: row.version,
    invitation: invitation
      ? {
          sentAt: invitation.madeAt.toISOString(),
          endsAt: invitation.endsAt.toISOString(),
          mail: mail?.state ?? null,
          fault: mail?.fault ?? null,
        }
      : null,
  };
}

export function presentOrganisation({ id, name, kind, version }: OrganisationRow): OrganisationView {
  return { id, name, kind, version };
}

export function presentLink({ name, mail, organisationName }: PersonRow): LinkView {
  return { name, mail, organisationName };
}

export function presentOwn(row: PersonRow): OwnView {
  return { name: row.name, mail: row.mail, version: row.version, settings: presentSettings(row) };
}
