import { asc, desc, eq } from 'drizzle-orm';
import * as Y from 'yjs';
import { findingsOutline, type FindingsNode } from '#shared/contracts/findings.ts';
import { workingStates } from '#shared/vocabulary/case-states.ts';
import type { Reader, Transaction } from '../database/connection.ts';
import { findingsUpdates } from '../database/tables/findings.ts';
import { lockCaseRow } from '../rights/queries.ts';
import { writeNodes } from './findings-nodes.ts';

/** The name of the text inside its Yjs document, as the editor knows it. */
export const findingsField = 'default';

/** The text of a case as its committed updates make it, and when the last of them was kept. */
export async function loadFindings(reader: Reader, caseId: string): Promise<{ text: Y.Doc; keptAt: Date | null }> {
  const rows = await reader.db
    .select({ update: findingsUpdates.update, madeAt: findingsUpdates.madeAt })
    .from(findingsUpdates)
    .where(eq(findingsUpdates.caseId, caseId))
    .orderBy(asc(findingsUpdates.id));
  const text = new Y.Doc();
  text.transact(() => {
    for (const row of rows) Y.applyUpdate(text, row.update);
  });
  return { text, keptAt: rows.at(-1)?.madeAt ?? null };
}

/** Appends what a person wrote; null for the outline, which nobody wrote. */
export async function appendUpdate(
  tx: Transaction,
  row: { caseId: string; update: Uint8Array; madeBy: string | null },
): Promise<void> {
  await tx.db.insert(findingsUpdates).values({ ...row, madeAt: tx.at });
}

/**
 * Gives a case without a text its outline, once: the case row is locked, so that two who open it at the same moment do
 * not both make one. A case that takes no writing now gets none.
 */
export async function ensureOutline(tx: Transaction, caseId: string): Promise<void> {
  const row = await lockCaseRow(tx, caseId);
  if (!row || row.holdReason !== null || !workingStates.some((state) => state === row.state)) return;
  const [found] = await tx.db
    .select({ id: findingsUpdates.id })
    .from(findingsUpdates)
    .where(eq(findingsUpdates.caseId, caseId))
    .orderBy(desc(findingsUpdates.id))
    .limit(1);
  if (found) return;
  const text = new Y.Doc();
  writeNodes(text.getXmlFragment(findingsField), outlineNodes());
  await appendUpdate(tx, { caseId, update: Y.encodeStateAsUpdate(text), madeBy: null });
}

function outlineNodes(): FindingsNode[] {
  return findingsOutline.flatMap((words): FindingsNode[] => [
    { type: 'heading', attrs: { level: 2 }, content: [{ type: 'text', text: words }] },
    { type: 'paragraph' },
  ]);
}
