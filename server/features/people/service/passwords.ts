import type { PasswordChange } from '#shared/contracts/people.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context, VisitorContext } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { enqueueJob } from '../../../jobs/enqueue.ts';
import { writeMail } from '../../../mail/write-mail.ts';
import {
  findPersonById,
  findPersonByMail,
  lockPerson,
  tellPersonChanged,
  updatePerson,
  type PersonRow,
} from '../queries.ts';
import { countLinksSince, takeLinksBack } from '../queries/one-time-links.ts';
import { endSessions } from '../queries/sessions.ts';
import { checkPassword, hashChosen } from './accept-invitation.ts';
import { loadPersonOf } from './load-person.ts';
import { makeLink, spendForOwner } from './one-time-link.ts';
import { hashPassword, passwordFits } from './password.ts';
import { admitTry, forgiveAddress, forgiveTry } from './sign-in-limits.ts';

const hourMs = 3_600_000;
// Enough for someone who looks in the wrong mailbox first; more would let anyone fill another's mailbox.
const mostLinksAnHour = 3;

/**
 * Takes note that someone asks for a new password. Whether the address belongs to anyone is looked up later, in a job,
 * so that the answer and its time are the same for every address.
 */
export function askForPassword(context: VisitorContext, mail: string): Promise<void> {
  return context.inTransaction((tx) => enqueueJob(tx, 'send-password-link', { mail }));
}

/** Sends the link to the open account of the address, if there is one; it holds an hour and works once. */
export function sendPasswordLink(context: VisitorContext, mail: string): Promise<void> {
  return context.inTransaction(async (tx) => {
    const found = await findPersonByMail(tx, mail);
    const row = found && (await lockPerson(tx, found.id));
    if (row?.state !== 'open') return;
    const anHourAgo = new Date(tx.at.getTime() - hourMs);
    if ((await countLinksSince(tx, row.id, 'password', anHourAgo)) >= mostLinksAnHour) return;
    await takeLinksBack(tx, row.id);
    const link = await makeLink(tx, { purpose: 'password', personId: row.id, madeBy: null });
    await writeMail(tx, {
      to: row.mail,
      subject: 'A new password for Hacklebook',
      body: 'Someone asked for a new password for this address. If it was not you, leave this mail alone: nothing has changed. The link holds one hour and works once.',
      link,
    });
    await recordAct(tx, null, { act: 'password.asked', objectId: row.id });
  });
}

/** Sets the password chosen over a link, and ends every session of the person. Of two at once one wins. */
export async function setPasswordByLink(context: VisitorContext, token: string, password: string): Promise<void> {
  const passwordHash = await hashChosen(context, { token, purpose: 'password' }, password);
  await context.inTransaction(async (tx) => {
    const row = await spendForOwner(tx, { token, purpose: 'password', state: 'open' });
    await keepPassword(tx, row, passwordHash);
    await forgiveAddress(tx, row.mail);
  });
}

/**
 * Changes one's own password; the session it is changed in goes on, all others end.
 * @throws Problem not-valid when the current one is wrong, too-many-tries after several wrong ones
 */
export async function changePassword(
  context: Context,
  change: PasswordChange,
  here: { sessionId: string; machine: string },
): Promise<void> {
  const row = loadPersonOf(await findPersonById(context.reader, context.person.id));
  checkPassword(change.password, row);
  const from = { mail: row.mail, machine: here.machine };
  await context.besideAct((tx) => admitTry(tx, from));
  if (!(await passwordFits(change.current, row.passwordHash)))
    throw new Problem('not-valid', 'This is not your current password.', { field: 'current' });
  const passwordHash = await hashPassword(change.password);
  await context.inTransaction(async (tx) => {
    const now = loadPersonOf(await lockPerson(tx, row.id));
    await forgiveTry(tx, from);
    await keepPassword(tx, now, passwordHash, here.sessionId);
  });
}

async function keepPassword(tx: Transaction, row: PersonRow, passwordHash: string, goesOn?: string) {
  await updatePerson(tx, row, { passwordHash });
  await takeLinksBack(tx, row.id);
  await endSessions(tx, row.id, goesOn);
  await tellPersonChanged(tx, row.id);
  await recordAct(tx, row, { act: 'password.set', objectId: row.id });
}
