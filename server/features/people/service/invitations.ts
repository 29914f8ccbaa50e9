import type { Invitation } from '#shared/contracts/people.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { writeMail } from '../../../mail/write-mail.ts';
import { insertPerson, lockPerson, updatePerson, type PersonRow } from '../queries.ts';
import { takeLinksBack } from '../queries/one-time-links.ts';
import { checkMailFree, checkPlace } from './check-account.ts';
import { loadPersonOf } from './load-person.ts';
import { makeLink } from './one-time-link.ts';

type Inviter = { readonly id: string; readonly name: string } | null;

/** Under which invitations go out, and by which their mail is found again. */
export const invitationSubject = 'Invitation to Hacklebook';

/** Invites a person: an account without a password, and a mail with a link that holds seven days and works once. */
export function invitePerson(context: Context, entry: Invitation): Promise<string> {
  return context.inTransaction(async (tx) => (await writeInvitation(tx, context.person, entry)).id);
}

/** The same within a transaction under way. @returns the account's id and the link's path */
export async function writeInvitation(tx: Transaction, inviter: Inviter, entry: Invitation) {
  const { name, mail, organisationId, roles } = entry;
  const organisation = await checkPlace(tx, entry);
  await checkMailFree(tx, mail);
  const { id } = await insertPerson(tx, { name, mail, organisationId, state: 'invited', madeAt: tx.at }, roles);
  await recordAct(tx, inviter, {
    act: 'person.invited',
    objectId: id,
    after: { name, mail, organisation: organisation.name, roles },
  });
  return { id, link: await sendInvitation(tx, inviter, { id, mail }) };
}

/** Sends a new link to an invited person; the old one dies. @throws Problem wrong-state once it was accepted */
export function inviteAgain(context: Context, personId: string): Promise<void> {
  return context.inTransaction(async (tx) => {
    const row = await loadInvited(tx, personId);
    await recordAct(tx, context.person, { act: 'invitation.sent-again', objectId: row.id });
    await sendInvitation(tx, context.person, row);
  });
}

/** Takes an invitation back: its link dies, and the account stands closed until it is opened again. */
export function takeInvitationBack(context: Context, personId: string): Promise<void> {
  return context.inTransaction(async (tx) => {
    const row = await loadInvited(tx, personId);
    await takeLinksBack(tx, row.id);
    await updatePerson(tx, row, { state: 'closed' });
    await recordAct(tx, context.person, {
      act: 'invitation.taken-back',
      objectId: row.id,
      before: { state: row.state },
      after: { state: 'closed' },
    });
  });
}

/** Makes the person's one living invitation and writes its mail. @returns the link's path */
export async function sendInvitation(tx: Transaction, inviter: Inviter, person: { id: string; mail: string }) {
  await takeLinksBack(tx, person.id);
  const link = await makeLink(tx, { purpose: 'invitation', personId: person.id, madeBy: inviter?.id ?? null });
  await writeMail(tx, {
    to: person.mail,
    subject: invitationSubject,
    body: 'You are invited to the casebook of a fracture laboratory. The link holds seven days and works once.',
    link,
  });
  return link;
}

async function loadInvited(tx: Transaction, personId: string): Promise<PersonRow> {
  const row = loadPersonOf(await lockPerson(tx, personId));
  if (row.state !== 'invited') throw new Problem('wrong-state', `${row.name} has no open invitation.`);
  return row;
}
