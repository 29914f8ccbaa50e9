import type { Role } from '#shared/vocabulary/roles.ts';
import { rolesFault } from '#shared/rules/roles-fault.ts';
import type { Transaction } from '../../../database/connection.ts';
import { Problem } from '../../../http/problem.ts';
import { countAdministrators, findPersonByMail, type PersonRow } from '../queries.ts';
import { findOrganisation } from '../queries/organisations.ts';

/** The organisation of an account. @throws Problem not-valid when there is none or the roles may not be held in it */
export async function checkPlace(tx: Transaction, account: { organisationId: string; roles: readonly Role[] }) {
  const organisation = await findOrganisation(tx, account.organisationId);
  if (!organisation)
    throw new Problem('not-valid', 'This organisation is not entered here.', { field: 'organisationId' });
  const fault = rolesFault(account.roles, organisation.kind);
  if (fault) throw new Problem('not-valid', fault, { field: 'roles' });
  return organisation;
}

/** @throws Problem already-there when another account has the address */
export async function checkMailFree(tx: Transaction, mail: string, of?: { id: string }): Promise<void> {
  const holder = await findPersonByMail(tx, mail);
  if (!holder || holder.id === of?.id) return;
  const how = holder.state === 'closed' ? ' It is closed; open it again instead.' : '';
  throw new Problem('already-there', `${holder.name} has an account under this address already.${how}`, {
    field: 'mail',
  });
}

/** @throws Problem wrong-state when without this account nobody could administer the laboratory any more */
export async function checkNotLastAdministrator(tx: Transaction, row: PersonRow): Promise<void> {
  if (row.state !== 'open' || !row.roles.includes('administrator')) return;
  if ((await countAdministrators(tx)) > 1) return;
  throw new Problem(
    'wrong-state',
    `${row.name} is the last administrator. Give the role to someone else first; until then it stays here.`,
    { field: 'roles' },
  );
}
