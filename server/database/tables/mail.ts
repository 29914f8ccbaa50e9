import { index, integer, pgTable, text } from 'drizzle-orm/pg-core';
import { id, instant } from '../columns.ts';

/** The outbox: written in the transaction of the act, sent after the commit, once. The link is erased when it has gone. */
export const outgoingMails = pgTable(
  'outgoing_mails',
  {
    id: id(),
    toMail: text().notNull(),
    subject: text().notNull(),
    body: text().notNull(),
    link: text(),
    state: text({ enum: ['waiting', 'gone', 'came back'] }).notNull(),
    tries: integer().notNull().default(0),
    fault: text(),
    writtenAt: instant().notNull(),
    goneAt: instant(),
  },
  (t) => [index().on(t.state), index().on(t.writtenAt)],
);

/** Where messages go when no mail server is configured: a box on this machine that an administrator reads. */
export const heldMails = pgTable('held_mails', {
  id: id(),
  toMail: text().notNull(),
  subject: text().notNull(),
  body: text().notNull(),
  heldAt: instant().notNull(),
});
