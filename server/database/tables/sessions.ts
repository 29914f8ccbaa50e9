import { index, json, pgTable, timestamp, varchar } from 'drizzle-orm/pg-core';

/** Written by connect-pg-simple, which fixes these columns. */
export const sessions = pgTable(
  'sessions',
  {
    sid: varchar().primaryKey(),
    sess: json().notNull(),
    expire: timestamp({ precision: 6 }).notNull(),
  },
  (t) => [index('sessions_expire_idx').on(t.expire)],
);
