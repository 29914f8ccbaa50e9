import type { Person, PersonSettings } from '#shared/contracts/people.ts';
import type { PersonRow } from './queries.ts';

export function presentPerson(row: PersonRow): Person {
  const { id, name, mail, organisationId, organisationName, organisationKind, roles } = row;
  return { id, name, mail, organisationId, organisationName, organisationKind, roles };
}

export function presentSettings(row: PersonRow): PersonSettings {
  const { theme, roomyRows, letterKeys } = row;
  return { theme, roomyRows, letterKeys };
}
