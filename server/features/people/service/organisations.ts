import type { OrganisationChange, OrganisationEntry } from '#shared/contracts/people.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { VisitorContext } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { presentOrganisation } from '../present.ts';
import { insertOrganisation } from '../queries.ts';
import { findOrganisation, listOrganisations, renameOrganisation } from '../queries/organisations.ts';

/** Enters an organisation whose people may then be invited. @throws Problem already-there for a name entered before */
export function enterOrganisation(context: VisitorContext, entry: OrganisationEntry) {
  return context.inTransaction((tx) => writeOrganisation(tx, context.person, entry));
}

/** The same within a transaction under way. */
export async function writeOrganisation(tx: Transaction, doer: VisitorContext['person'], entry: OrganisationEntry) {
  await checkNameFree(tx, entry.name);
  if (entry.kind === 'laboratory') await checkFirstLaboratory(tx);
  const organisation = await insertOrganisation(tx, entry);
  await recordAct(tx, doer, { act: 'organisation.entered', objectId: organisation.id, after: entry });
  return organisation;
}

/** Renames an organisation; its kind stays, because rights hang on it. @throws Problem stale-version, already-there */
export function changeOrganisation(context: VisitorContext, id: string, change: OrganisationChange) {
  return context.inTransaction(async (tx) => {
    const before = await findOrganisation(tx, id);
    if (!before) throw new Problem('not-found', 'There is no organisation under this address.');
    if (before.name !== change.name) await checkNameFree(tx, change.name);
    const after = await renameOrganisation(tx, { id, version: change.version }, change.name);
    if (!after)
      throw new Problem('stale-version', `${before.name} was changed meanwhile; look at both.`, {
        current: presentOrganisation((await findOrganisation(tx, id)) ?? before),
      });
    await recordAct(tx, context.person, {
      act: 'organisation.changed',
      objectId: id,
      before: { name: before.name },
      after: { name: after.name },
    });
    return after;
  });
}

// Its people see every case, so a second one would be a way round the walls.
async function checkFirstLaboratory(tx: Transaction): Promise<void> {
  const laboratory = (await listOrganisations(tx)).find(({ kind }) => kind === 'laboratory');
  if (laboratory)
    throw new Problem('already-there', `This book has its laboratory already: ${laboratory.name}.`, { field: 'kind' });
}

async function checkNameFree(tx: Transaction, name: string): Promise<void> {
  const organisations = await listOrganisations(tx);
  if (organisations.some((entered) => entered.name.toLowerCase() === name.toLowerCase()))
    throw new Problem('already-there', `${name} is entered already.`, { field: 'name' });
}
