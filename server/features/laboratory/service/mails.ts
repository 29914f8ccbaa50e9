import type { HeldMailOpened, HeldMailPage, MailPage } from '#shared/contracts/laboratory.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { findHeld, listHeld, listOutgoing, waitAgain } from '../../../mail/queries.ts';
import { enqueueSending } from '../../../mail/write-mail.ts';
import { presentHeld, presentMail, presentOpened } from '../present.ts';

const mailsOnAPage = 50;

/** One page of the outbox, newest first. */
export async function listMails({ reader }: Pick<Context, 'reader'>, before?: string): Promise<MailPage> {
  const rows = await listOutgoing(reader, { before, most: mailsOnAPage + 1 });
  const shown = rows.slice(0, mailsOnAPage);
  return { mails: shown.map(presentMail), older: rows.length > shown.length ? (shown.at(-1)?.id ?? null) : null };
}

/** One page of the box on this machine, newest first, without the words of the mails. */
export async function listHeldMails({ reader }: Pick<Context, 'reader'>, before?: string): Promise<HeldMailPage> {
  const rows = await listHeld(reader, { before, most: mailsOnAPage + 1 });
  const shown = rows.slice(0, mailsOnAPage);
  return { mails: shown.map(presentHeld), older: rows.length > shown.length ? (shown.at(-1)?.id ?? null) : null };
}

/** Opens a held mail. It may carry a link meant for someone else, so the trail says who read it. */
export function openHeldMail(context: Context, id: string): Promise<HeldMailOpened> {
  return context.inTransaction(async (tx) => {
    const row = await findHeld(tx, id);
    if (!row) throw new Problem('not-found', 'There is no mail under this address.');
    const after = { to: row.toMail, subject: row.subject };
    await recordAct(tx, context.person, { act: 'held-mail.opened', objectId: id, after });
    return presentOpened(row);
  });
}

/** Sends a mail again that came back. @throws Problem wrong-state where it did not come back */
export function sendMailAgain(context: Context, id: string): Promise<void> {
  return context.inTransaction(async (tx) => {
    const row = await waitAgain(tx, id);
    if (!row) throw new Problem('wrong-state', 'This mail did not come back, so it is not sent again.');
    const after = { to: row.toMail, subject: row.subject };
    await recordAct(tx, context.person, { act: 'mail.sent-again', objectId: id, after });
    await enqueueSending(tx, id);
  });
}
