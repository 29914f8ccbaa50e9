import { and, desc, eq, lt } from 'drizzle-orm';
import type { Reader } from '../../../database/connection.ts';
import { auditEntries } from '../../../database/tables/acts.ts';

/** Entries of a case's trail, newest first, those before `before` where it is given. */
export function listEntries(reader: Reader, caseId: string, { before, limit }: { before?: number; limit: number }) {
  return reader.db
    .select({
      id: auditEntries.id,
      act: auditEntries.act,
      at: auditEntries.at,
      personName: auditEntries.personName,
      after: auditEntries.after,
      reason: auditEntries.reason,
    })
    .from(auditEntries)
    .where(and(eq(auditEntries.chain, caseId), before === undefined ? undefined : lt(auditEntries.id, before)))
    .orderBy(desc(auditEntries.id))
    .limit(limit);
}
