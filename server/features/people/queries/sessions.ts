import { and, ne, sql } from 'drizzle-orm';
import type { Transaction } from '../../../database/connection.ts';
import { sessions } from '../../../database/tables/sessions.ts';

/** Ends every session of the person, on all machines; `except` is the id of one that goes on. */
export async function endSessions(tx: Transaction, personId: string, except?: string) {
  await tx.db
    .delete(sessions)
    .where(
      and(
        sql`${sessions.sess} -> 'passport' ->> 'user' = ${personId}`,
        except === undefined ? undefined : ne(sessions.sid, except),
      ),
    );
}
