import * as Y from 'yjs';
import type { FindingsNode } from '#shared/contracts/findings.ts';
import { recordAct } from '../../../audit/record-act.ts';
import { appendUpdate, ensureOutline, findingsField, loadFindings } from '../../../collaboration/findings-rows.ts';
import { writeNodes } from '../../../collaboration/findings-nodes.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';

/**
 * Writes a whole text as that person, without a page: what stood there is struck out, as if by hand, and stays in the
 * updates. For a text that nobody has open; who has it open sees it at the next opening.
 * @param content nodes of the editor (ProseMirror JSON); a bound value names its binding, a figure its record
 */
export function writeFindings(
  context: Context,
  heldCase: HeldFor<'write findings'>,
  content: readonly FindingsNode[],
): Promise<void> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'write findings');
    await ensureOutline(tx, heldCase.id);
    const { text } = await loadFindings(tx, heldCase.id);
    const before = Y.encodeStateVector(text);
    text.transact(() => {
      const fragment = text.getXmlFragment(findingsField);
      fragment.delete(0, fragment.length);
      writeNodes(fragment, content);
    });
    const update = Y.encodeStateAsUpdate(text, before);
    await appendUpdate(tx, { caseId: heldCase.id, update, madeBy: context.person.id });
    await recordAct(tx, context.person, { act: 'findings.written', inCase: heldCase });
  });
}
