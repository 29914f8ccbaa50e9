import type { Role } from '#shared/vocabulary/roles.ts';
import type { VisitorContext } from '../../../http/context.ts';
import { recordAct } from '../../../audit/record-act.ts';
import { insertPerson } from '../queries.ts';
import { hashPassword } from './password.ts';

export { enterOrganisation } from './organisations.ts';

/** Admits a person with a password of their own: for the demo and tests. Everyone else is invited. */
export async function admitPerson(
  context: VisitorContext,
  entry: { name: string; mail: string; organisationId: string; roles: readonly Role[]; password: string },
) {
  const passwordHash = await hashPassword(entry.password);
  return context.inTransaction(async (tx) => {
    const { name, mail, organisationId, roles } = entry;
    const person = await insertPerson(
      tx,
      { name, mail, organisationId, passwordHash, state: 'open', madeAt: tx.at },
      roles,
    );
    await recordAct(tx, context.person, { act: 'person.admitted', objectId: person.id, after: { name, mail, roles } });
    return person;
  });
}
