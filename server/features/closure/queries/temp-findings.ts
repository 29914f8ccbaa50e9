import { eq, sql } from 'drizzle-orm';
import type { Transaction } from '../../../database/connection.ts';
import { findingsVersions } from '../../../database/tables/findings.ts';

export async function insertTempVersion(tx: Transaction, madeBy: string, caseId: string, name: string) {
  const [{ n }] = await tx.db
    .select({ n: sql<number>`count(*)::int` })
    .from(findingsVersions)
    .where(eq(findingsVersions.caseId, caseId));
  const content = { type: 'doc', content: [{ type: 'text', text: 'A few words.' }] };
  const [row] = await tx.db
    .insert(findingsVersions)
    .values({ caseId, number: n + 1, name, content, contentHash: 'x', madeBy, madeAt: tx.at })
    .returning({ id: findingsVersions.id, number: findingsVersions.number });
  return row;
}
