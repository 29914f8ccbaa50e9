import type { VisitorContext } from '../http/context.ts';
import type { Post } from './post.ts';
import { faultOf } from './fault.ts';
import { isWaiting, listWaitingIds, markGone, noteFault, takeWaiting } from './queries.ts';
import { enqueueSending } from './write-mail.ts';

// With the jobs' growing waits, five tries reach over about five minutes; then a person looks at it.
const mostTries = 5;

type SendingContext = Pick<VisitorContext, 'reader' | 'inTransaction'>;

/**
 * Sends one mail of the outbox, once: its row stays locked while it goes, and its link is erased with the mark that it
 * has gone. A fault is noted in the row and thrown, so that the job tries again; after the last try, or when the mail
 * server's no is final, it came back.
 */
export async function sendMail(context: SendingContext, post: Post, mailId: string): Promise<void> {
  const outcome = await context.inTransaction(async (tx) => {
    const mail = await takeWaiting(tx, mailId);
    if (!mail) return (await isWaiting(tx, mailId)) ? 'held by another' : 'done';
    try {
      await post(tx, mail);
    } catch (error) {
      const { words, isFinal } = faultOf(error);
      const cameBack = isFinal || mail.tries + 1 >= mostTries;
      await noteFault(tx, mail.id, { fault: words, state: cameBack ? 'came back' : 'waiting' });
      return cameBack ? 'done' : 'try again';
    }
    await markGone(tx, mail.id);
    return 'done';
  });
  if (outcome === 'try again') throw new Error(`mail ${mailId} did not go; it is tried again`);
  if (outcome === 'held by another') throw new Error(`mail ${mailId} is being sent by another runner; looked at again`);
}

/** Puts a job down for every mail still waiting: what a stopped process left behind goes after the next start. */
export async function sendWaiting(context: SendingContext): Promise<void> {
  const waiting = await listWaitingIds(context.reader);
  if (waiting.length === 0) return;
  await context.inTransaction(async (tx) => {
    for (const { id } of waiting) await enqueueSending(tx, id);
  });
}
