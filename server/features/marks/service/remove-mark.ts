import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { presentMark } from '../present.ts';
import type { MarkPlace } from './change-mark.ts';
import { followMark, seenOf } from './follow-mark.ts';
import { loadMark, loadMarkSeen } from './load-mark.ts';

/** Takes a mark off its image. It and its versions are kept, and it can be brought back. */
export function removeMark(context: Context, heldCase: HeldFor<'mark'>, place: MarkPlace, versionSeen: number) {
  return putRemoved(context, heldCase, place, { versionSeen, removed: true });
}

/** Brings back a mark that was taken off, as it was. */
export function restoreMark(context: Context, heldCase: HeldFor<'mark'>, place: MarkPlace, versionSeen: number) {
  return putRemoved(context, heldCase, place, { versionSeen, removed: false });
}

function putRemoved(
  context: Context,
  heldCase: HeldFor<'mark'>,
  place: MarkPlace,
  wanted: { versionSeen: number; removed: boolean },
) {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'mark');
    const row = await loadMarkSeen(tx, heldCase, place, wanted.versionSeen);
    if (row.removed === wanted.removed) return presentMark(row);
    await followMark(tx, context, heldCase, row, {
      act: wanted.removed ? 'mark.removed' : 'mark.restored',
      words: wanted.removed ? 'was taken off' : 'was brought back',
      seen: { ...seenOf(row), removed: wanted.removed },
      changesReadings: true,
    });
    return presentMark(await loadMark(tx, heldCase, row.id));
  });
}
