import type { Person } from '#shared/contracts/people.ts';
import type { Reader } from '../../../database/connection.ts';
import { presentPerson } from '../present.ts';
import { listPeople } from '../queries.ts';

/** The laboratory's managers with an open account: who hears that something waits to be signed. */
export async function listManagers(reader: Reader): Promise<Person[]> {
  const rows = await listPeople(reader);
  return rows
    .filter(({ state, organisationKind }) => state === 'open' && organisationKind === 'laboratory')
    .filter(({ roles }) => roles.includes('manager'))
    .map(presentPerson);
}
