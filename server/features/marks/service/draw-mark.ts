import type { MarkSent } from '#shared/contracts/marks.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { findMarkedImage, findMarkRow, insertMark, insertVersion, takeMarkNumber } from '../queries.ts';
import { presentMark } from '../present.ts';
import { checkMark } from './check-mark.ts';
import { loadMark } from './load-mark.ts';

/** Keeps a new mark under the next number of its case. A mark sent twice is kept once and answered again. */
export function drawMark(context: Context, heldCase: HeldFor<'mark'>, fractographId: string, drawn: MarkSent) {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'mark');
    const image = await findMarkedImage(tx, heldCase, fractographId);
    if (!image) throw nothingHere();
    checkMark(drawn.kind, drawn.geometry, image);
    const { id, kind, ...seen } = drawn;
    const kept = id && (await findMarkRow(tx, heldCase, id));
    if (kept) return presentMark(kept);
    const number = await takeMarkNumber(tx, heldCase);
    const mark = await insertMark(tx, { ...(id ? { id } : {}), caseId: heldCase.id, fractographId, number, kind });
    if (!mark) throw new Problem('already-there', 'A mark of this id is there already.', { field: 'id' });
    await insertVersion(tx, {
      ...seen,
      caseId: heldCase.id,
      markId: mark.id,
      version: 1,
      madeBy: context.person.id,
      madeAt: tx.at,
    });
    await recordAct(tx, context.person, {
      act: 'mark.drawn',
      inCase: heldCase,
      objectId: mark.id,
      after: { mark: `m${number}`, kind, fractographId, ...seen },
    });
    return presentMark(await loadMark(tx, heldCase, mark.id));
  });
}
