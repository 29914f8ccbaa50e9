import type { AccountChange, VersionSeen } from '#shared/contracts/people.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { presentAccount } from '../present.ts';
import { lockPerson, replaceRoles, tellPersonChanged, updatePerson, type PersonRow } from '../queries.ts';
import { takeLinksBack } from '../queries/one-time-links.ts';
import { endSessions } from '../queries/sessions.ts';
import { checkMailFree, checkNotLastAdministrator, checkPlace } from './check-account.ts';
import { sendInvitation } from './invitations.ts';
import { loadPersonOf } from './load-person.ts';

/**
 * Changes name, address, organisation and roles of an account; they hold from its next request on. An open invitation
 * goes to the new address, and its old link dies.
 * @throws Problem stale-version with the account as it stands
 */
export function changeAccount(context: Context, personId: string, change: AccountChange): Promise<void> {
  return context.inTransaction(async (tx) => {
    const row = await loadSeen(tx, personId, change);
    const organisation = await checkPlace(tx, change);
    await checkMailFree(tx, change.mail, row);
    if (!change.roles.includes('administrator')) await checkNotLastAdministrator(tx, row);
    const { name, mail, organisationId, roles } = change;
    await updatePerson(tx, row, { name, mail, organisationId });
    await replaceRoles(tx, row.id, roles);
    await tellPersonChanged(tx, row.id);
    await recordAct(tx, context.person, {
      act: 'person.changed',
      objectId: row.id,
      before: { name: row.name, mail: row.mail, organisation: row.organisationName, roles: row.roles },
      after: { name, mail, organisation: organisation.name, roles },
    });
    if (mail.toLowerCase() === row.mail.toLowerCase()) return;
    await takeLinksBack(tx, row.id);
    if (row.state === 'invited') await sendInvitation(tx, context.person, { id: row.id, mail });
  });
}

/** Closes an account: its sessions and links end at once; what the person signed and wrote stays. */
export function closeAccount(context: Context, personId: string, seen: VersionSeen): Promise<void> {
  return context.inTransaction(async (tx) => {
    const row = await loadSeen(tx, personId, seen);
    if (row.state === 'closed') throw new Problem('wrong-state', `The account of ${row.name} is closed already.`);
    await checkNotLastAdministrator(tx, row);
    await updatePerson(tx, row, { state: 'closed' });
    await takeLinksBack(tx, row.id);
    await endSessions(tx, row.id);
    await tellPersonChanged(tx, row.id);
    await recordState(tx, context, { act: 'person.closed', row, state: 'closed' });
  });
}

/** Opens a closed account again; one that never had a password is invited anew. */
export function openAccountAgain(context: Context, personId: string, seen: VersionSeen): Promise<void> {
  return context.inTransaction(async (tx) => {
    const row = await loadSeen(tx, personId, seen);
    if (row.state !== 'closed') throw new Problem('wrong-state', `The account of ${row.name} is not closed.`);
    const state = row.passwordHash === null ? 'invited' : 'open';
    await updatePerson(tx, row, { state });
    await recordState(tx, context, { act: 'person.opened-again', row, state });
    if (state === 'invited') await sendInvitation(tx, context.person, row);
  });
}

function recordState(
  tx: Transaction,
  context: Context,
  { act, row, state }: { act: 'person.closed' | 'person.opened-again'; row: PersonRow; state: PersonRow['state'] },
) {
  return recordAct(tx, context.person, { act, objectId: row.id, before: { state: row.state }, after: { state } });
}

/** The locked row. @throws Problem stale-version when it has changed since it was seen */
async function loadSeen(tx: Transaction, personId: string, { version }: VersionSeen): Promise<PersonRow> {
  const row = loadPersonOf(await lockPerson(tx, personId));
  if (row.version !== version)
    throw new Problem('stale-version', `The account of ${row.name} was changed meanwhile; look at both.`, {
      current: presentAccount(row),
    });
  return row;
}
