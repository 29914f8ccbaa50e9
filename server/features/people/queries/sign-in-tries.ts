import { eq, sql } from 'drizzle-orm';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { signInTries } from '../../../database/tables/people.ts';

/** How failed tries of one key are met: how many are free, how long the first wait is, how long they are remembered. */
export type TryLimit = { key: string; free: number };

const windowMinutes = 15;
const firstWaitMinutes = 5;
const longestWaitMinutes = 60;

/**
 * Counts one try against a key before it is known whether it fails, so that many at once cannot slip past the limit.
 * With the last free try the key is locked for five minutes, with each further one twice as long, up to an hour.
 * @returns tries counted, or null while the key is locked
 */
export async function countTry(tx: Transaction, { key, free }: TryLimit): Promise<number | null> {
  const at = sql`${tx.at.toISOString()}::timestamptz`;
  const isForgotten = sql`greatest(${signInTries.firstAt}, ${signInTries.lockedUntil}) < ${at} - make_interval(mins => ${windowMinutes})`;
  const failures = sql`case when ${isForgotten} then 1 else ${signInTries.failures} + 1 end`;
  const waitMinutes = sql`least(${longestWaitMinutes}::int, ${firstWaitMinutes}::int * 2 ^ least(10, ${failures} - ${free}::int))`;
  const rows = await tx.db
    .insert(signInTries)
    .values({ key, failures: 1, firstAt: tx.at })
    .onConflictDoUpdate({
      target: signInTries.key,
      set: {
        failures,
        firstAt: sql`case when ${isForgotten} then ${at} else ${signInTries.firstAt} end`,
        lockedUntil: sql`case when ${failures} >= ${free}::int then ${at} + make_interval(mins => (${waitMinutes})::int) end`,
      },
      setWhere: sql`${signInTries.lockedUntil} is null or ${signInTries.lockedUntil} <= ${at}`,
    })
    .returning({ failures: signInTries.failures });
  return rows[0]?.failures ?? null;
}

export async function findLockEnd(reader: Reader, key: string): Promise<Date | null> {
  const [row] = await reader.db
    .select({ lockedUntil: signInTries.lockedUntil })
    .from(signInTries)
    .where(eq(signInTries.key, key));
  return row?.lockedUntil ?? null;
}

/** Forgets the tries of a key: its owner has come in. */
export async function forgetTries(tx: Transaction, key: string) {
  await tx.db.delete(signInTries).where(eq(signInTries.key, key));
}

/** Takes back the one try that was counted before it was known to succeed. */
export async function takeTryBack(tx: Transaction, { key, free }: TryLimit) {
  await tx.db
    .update(signInTries)
    .set({
      failures: sql`greatest(0, ${signInTries.failures} - 1)`,
      lockedUntil: sql`case when ${signInTries.failures} - 1 >= ${free}::int then ${signInTries.lockedUntil} end`,
    })
    .where(eq(signInTries.key, key));
}
