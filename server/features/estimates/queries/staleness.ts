import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Reader } from '../../../database/connection.ts';
import { staleness } from '../../../database/tables/acts.ts';

export type StalenessRow = Awaited<ReturnType<typeof listStaleness>>[number];

/** Why estimates are or were stale, and how it was settled; oldest first. */
export async function listStaleness(reader: Reader, estimateIds: readonly string[]) {
  if (estimateIds.length === 0) return [];
  return reader.db
    .select()
    .from(staleness)
    .where(and(eq(staleness.recordKind, 'estimate'), inArray(staleness.recordId, [...estimateIds])))
    .orderBy(asc(staleness.since), asc(staleness.causeId));
}
