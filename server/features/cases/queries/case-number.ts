import { sql } from 'drizzle-orm';
import { caseNumberOf } from '#shared/wording/case-numbers.ts';
import type { Transaction } from '../../../database/connection.ts';
import { counters } from '../../../database/tables/acts.ts';

/**
 * The next number of the year, in UTC. The counter's row stays locked until the transaction ends, so that of many at
 * once each waits for the one before, and a failed one gives its number back.
 */
export async function takeCaseNumber(tx: Transaction): Promise<string> {
  const year = tx.at.getUTCFullYear();
  const [counter] = await tx.db
    .insert(counters)
    .values({ name: `cases of ${year}`, value: 1 })
    .onConflictDoUpdate({ target: counters.name, set: { value: sql`${counters.value} + 1` } })
    .returning({ value: counters.value });
  return caseNumberOf(year, counter.value);
}
