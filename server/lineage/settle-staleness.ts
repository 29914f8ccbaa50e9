import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Reader, Transaction } from '../database/connection.ts';
import { staleness } from '../database/tables/acts.ts';

/** Open staleness of the given records. */
export function listOpenStaleness(reader: Reader, recordIds: readonly string[]) {
  if (recordIds.length === 0) return Promise.resolve([]);
  return reader.db
    .select()
    .from(staleness)
    .where(and(inArray(staleness.recordId, [...recordIds]), isNull(staleness.settledAt)));
}

/** A person settles that a record is stale: takes the new value, or keeps the old with a reason. */
export async function settleStaleness(
  tx: Transaction,
  recordId: string,
  settled: { by: string; settlement: 'taken' | 'kept'; reason: string | null },
): Promise<void> {
  await tx.db
    .update(staleness)
    .set({ settledAt: tx.at, settledBy: settled.by, settlement: settled.settlement, reason: settled.reason })
    .where(and(eq(staleness.recordId, recordId), isNull(staleness.settledAt)));
}
