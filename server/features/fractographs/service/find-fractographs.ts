import type { FractographView } from '#shared/contracts/fractographs.ts';
import type { FractographId } from '#shared/contracts/ids.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Reader } from '../../../database/connection.ts';
import { nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { presentFractograph } from '../present.ts';
import { findFractographRow, findLargestFigureNumber, listFractographRows } from '../queries/fractographs.ts';
import { findScale, listScales } from './find-scale.ts';

/** The fractographs of a case in the order of their figures, each with its scale in force. */
export async function listFractographs(reader: Reader, heldCase: HeldFor<CaseAct>): Promise<FractographView[]> {
  const rows = await listFractographRows(reader, heldCase);
  const scales = await listScales(
    reader,
    rows.map((row) => row.fractograph.id),
  );
  return rows.map((row) => presentFractograph(row, scales.get(row.fractograph.id) ?? null));
}

/** One fractograph of the case. @throws Problem not-found */
export async function loadFractograph(
  reader: Reader,
  heldCase: HeldFor<CaseAct>,
  id: FractographId,
): Promise<FractographView> {
  const row = await findFractographRow(reader, heldCase, id);
  if (!row) throw nothingHere();
  return presentFractograph(row, await findScale(reader, id));
}

/** The largest figure number given in the case, 0 while there is none. */
export function largestFigureNumber(reader: Reader, heldCase: HeldFor<CaseAct>): Promise<number> {
  return findLargestFigureNumber(reader, heldCase);
}
