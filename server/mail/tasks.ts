import { z } from 'zod';
import type { TaskTable } from '../jobs/run-jobs.ts';
import { postFor, type MailSettings } from './post.ts';
import { sendMail } from './send-mail.ts';

const Sending = z.object({ mailId: z.uuid() });

/** The jobs of the outbox. */
export function mailTasks(settings: MailSettings): TaskTable {
  const post = postFor(settings);
  return { 'send-mail': (context, payload) => sendMail(context, post, Sending.parse(payload).mailId) };
}
