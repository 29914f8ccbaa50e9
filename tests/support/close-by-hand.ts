import { eq } from 'drizzle-orm';
import { cases } from '#server/database/tables/cases.ts';
import type { TestServer } from './test-server.ts';

/** Puts a case straight into the closed state, for tests of what a closed case refuses. */
export async function closeByHand(server: TestServer, caseId: string): Promise<void> {
  const closedAt = new Date();
  await server.parts.database.db
    .update(cases)
    .set({ state: 'closed', closedAt, stateSince: closedAt })
    .where(eq(cases.id, caseId));
}
