import { isDeepStrictEqual } from 'node:util';
import type { MarkChanged } from '#shared/contracts/marks.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { presentMark } from '../present.ts';
import { findMarkedImage } from '../queries.ts';
import { checkMark } from './check-mark.ts';
import { followMark, seenOf } from './follow-mark.ts';
import { loadMark, loadMarkSeen } from './load-mark.ts';

export type MarkPlace = { readonly fractographId: string; readonly markId: string };

/**
 * Moves a mark or changes what is said of it: a new version, the former one kept. What was read from it turns stale only
 * when its geometry, boundary or origin code is another.
 */
export function changeMark(context: Context, heldCase: HeldFor<'mark'>, place: MarkPlace, changed: MarkChanged) {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'mark');
    const { versionSeen, ...changes } = changed;
    const row = await loadMarkSeen(tx, heldCase, place, versionSeen);
    if (row.removed) throw new Problem('wrong-state', `m${row.number} has been taken off; bring it back to change it.`);
    const image = await findMarkedImage(tx, heldCase, place.fractographId);
    if (!image) throw nothingHere();
    const before = seenOf(row);
    const seen = { ...before, ...changes };
    checkMark(row.kind, seen.geometry, image);
    if (isDeepStrictEqual(seen, before)) return presentMark(row);
    const moved = !isDeepStrictEqual(seen.geometry, before.geometry);
    const changesReadings = moved || seen.boundary !== before.boundary || seen.originCode !== before.originCode;
    await followMark(tx, context, heldCase, row, {
      act: moved ? 'mark.moved' : 'mark.changed',
      words: moved ? 'was moved' : 'was changed',
      seen,
      changesReadings,
    });
    return presentMark(await loadMark(tx, heldCase, row.id));
  });
}
