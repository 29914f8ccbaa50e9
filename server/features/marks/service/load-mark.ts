import { Problem } from '../../../http/problem.ts';
import type { Reader } from '../../../database/connection.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { presentMark } from '../present.ts';
import { findMarkRow, type HeldCase, type MarkRow } from '../queries.ts';

/** A mark as it stands. @throws Problem not-found */
export async function loadMark(reader: Reader, heldCase: HeldCase, markId: string): Promise<MarkRow> {
  const row = await findMarkRow(reader, heldCase, markId);
  if (!row) throw nothingHere();
  return row;
}

/**
 * A mark as it stands, for a change made from a version of it.
 * @throws Problem stale-version with the mark as it is now, when it has been changed since that version
 */
export async function loadMarkSeen(
  reader: Reader,
  heldCase: HeldCase,
  place: { fractographId: string; markId: string },
  versionSeen: number,
): Promise<MarkRow> {
  const row = await loadMark(reader, heldCase, place.markId);
  if (row.fractographId !== place.fractographId) throw nothingHere();
  if (row.version !== versionSeen) {
    throw new Problem('stale-version', `m${row.number} was changed by ${row.madeByName} meanwhile.`, {
      current: presentMark(row),
      stillHolds: 'Both versions are shown; nothing was lost.',
    });
  }
  return row;
}
