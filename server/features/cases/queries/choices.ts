import { and, eq, exists, inArray } from 'drizzle-orm';
import type { Role } from '#shared/vocabulary/roles.ts';
import type { Reader } from '../../../database/connection.ts';
import { organisations, people, personRoles } from '../../../database/tables/people.ts';

/** People of the laboratory with an open account and one of the roles, by name. */
export function listStaff(reader: Reader, roles: readonly Role[]) {
  return reader.db
    .select({ id: people.id, name: people.name })
    .from(people)
    .innerJoin(organisations, eq(people.organisationId, organisations.id))
    .where(
      and(
        eq(organisations.kind, 'laboratory'),
        eq(people.state, 'open'),
        exists(
          reader.db
            .select({ role: personRoles.role })
            .from(personRoles)
            .where(and(eq(personRoles.personId, people.id), inArray(personRoles.role, [...roles]))),
        ),
      ),
    )
    .orderBy(people.name);
}

export function listOrganisationNames(reader: Reader) {
  return reader.db
    .select({ id: organisations.id, name: organisations.name })
    .from(organisations)
    .orderBy(organisations.name);
}
