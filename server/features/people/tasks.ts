import { PasswordAsk } from '#shared/contracts/people.ts';
import type { TaskTable } from '../../jobs/run-jobs.ts';
import { sendPasswordLink } from './service/passwords.ts';

/** What of the accounts is done after the answer. */
export const peopleTasks: TaskTable = {
  'send-password-link': (context, payload) => sendPasswordLink(context, PasswordAsk.parse(payload).mail),
};
