import type { Transaction } from '../database/connection.ts';
import { enqueueJob } from '../jobs/enqueue.ts';
import { insertOutgoing } from './queries.ts';

export type MailToWrite = {
  readonly to: string;
  /** One line: what it is about, by number, state or the name of the act; never what a case holds. */
  readonly subject: string;
  readonly body: string;
  /** Below the server's own address, beginning with "/"; whoever sends it puts the address before it. */
  readonly link?: string;
};

/** Writes a mail into the outbox in the transaction of its act; it is sent once, after the commit. */
export async function writeMail(tx: Transaction, { to, subject, body, link }: MailToWrite): Promise<{ id: string }> {
  const mail = await insertOutgoing(tx, { toMail: to, subject, body, link, state: 'waiting', writtenAt: tx.at });
  await enqueueSending(tx, mail.id);
  return mail;
}

/** Puts the sending of one mail down as a job; one still waiting for the same mail is replaced. */
export function enqueueSending(tx: Transaction, mailId: string): Promise<void> {
  return enqueueJob(tx, 'send-mail', { mailId }, `send-mail:${mailId}`);
}
