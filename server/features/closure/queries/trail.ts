import { asc, eq, getTableColumns } from 'drizzle-orm';
import type { Reader } from '../../../database/connection.ts';
import { auditEntries } from '../../../database/tables/acts.ts';
import type { HeldCase } from './closures.ts';

const { id: _id, ...columns } = getTableColumns(auditEntries);

/** Every entry of the case's trail in the order it was written. */
export function listTrail(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select(columns)
    .from(auditEntries)
    .where(eq(auditEntries.chain, heldCase.id))
    .orderBy(asc(auditEntries.id));
}
