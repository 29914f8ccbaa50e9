import type { Context } from '../../../http/context.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { presentMark, presentVersion } from '../present.ts';
import { findMarkedImage, listMarkRows, listVersionRows, type HeldCase } from '../queries.ts';

/** The marks of a case that stand now. */
export async function listCaseMarks(context: Context, heldCase: HeldCase) {
  const rows = await listMarkRows(context.reader, heldCase);
  return rows.filter((row) => !row.removed).map(presentMark);
}

/** The marks of one fractograph, with those taken off, so that they can be brought back. */
export async function listMarks(context: Context, heldCase: HeldCase, fractographId: string) {
  if (!(await findMarkedImage(context.reader, heldCase, fractographId))) throw nothingHere();
  const rows = await listMarkRows(context.reader, heldCase, fractographId);
  return rows.map(presentMark);
}

/** Every state of one mark, newest first. */
export async function listVersions(context: Context, heldCase: HeldCase, markId: string) {
  const rows = await listVersionRows(context.reader, heldCase, markId);
  if (rows.length === 0) throw nothingHere();
  return rows.map(presentVersion);
}
