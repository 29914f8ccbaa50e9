import type { FractographFields, FractographView } from '#shared/contracts/fractographs.ts';
import type { FractographId } from '#shared/contracts/ids.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { enqueueJob } from '../../../jobs/enqueue.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import {
  countUsesOfBytes,
  hasFragment,
  insertFractograph,
  lockBytes,
  nextFigureNumber,
  withBytesLocked,
} from '../queries/fractographs.ts';
import { loadFractograph } from './find-fractographs.ts';

/** A file whose bytes are kept and hashed, and nothing more. */
export type ArrivedFile = { readonly sha256: string; readonly bytes: number; readonly fileName: string };

type Bringing = HeldFor<'bring in fractographs'>;

/**
 * Makes a kept file a fractograph of the case: it gets the next figure number and waits for its tiles to be cut.
 * Bytes already kept are only taken up; the same bytes twice in a case are allowed and pointed out.
 * @throws Problem closed-case when the case was closed while the file came; not-valid for a piece of another case
 */
export async function receiveFractograph(
  context: Context,
  heldCase: Bringing,
  arrived: ArrivedFile,
  fields: FractographFields,
): Promise<FractographView> {
  const id = await context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'bring in fractographs');
    await lockBytes(tx, arrived.sha256);
    await requireBytes(context, arrived.sha256);
    if (fields.fragmentId && !(await hasFragment(tx, heldCase, fields.fragmentId)))
      throw new Problem('not-valid', 'There is no such piece in this case.', { field: 'fragmentId' });
    const figureNumber = await nextFigureNumber(tx, heldCase);
    const row = await insertFractograph(tx, {
      ...fields,
      caseId: heldCase.id,
      figureNumber,
      ...arrived,
      state: 'checking',
      broughtInBy: context.person.id,
      broughtInAt: tx.at,
    });
    await recordAct(tx, context.person, {
      act: 'fractograph.received',
      inCase: heldCase,
      objectId: row.id,
      after: { figureNumber, ...arrived },
    });
    await enqueueJob(tx, 'cut-tiles', { fractographId: row.id }, `cut-tiles ${row.id}`);
    return row.id as FractographId; // brand: the id just given by the table
  });
  return loadFractograph(context.reader, heldCase, id);
}

/** Runs what follows on an arrival; where it fails, bytes that no row uses go again. */
export async function keepingNothingOnFailure<Done>(
  context: Context,
  sha256: string,
  work: () => Promise<Done>,
): Promise<Done> {
  try {
    return await work();
  } catch (error) {
    await withBytesLocked(context.reader, sha256, async (locked) => {
      if ((await countUsesOfBytes(locked, sha256, null)) === 0) await context.storage.dropOriginal(sha256);
    });
    throw error;
  }
}

/** Someone else's failed arrival of the same bytes may have taken them away a moment ago. */
async function requireBytes(context: Context, sha256: string): Promise<void> {
  await context.storage.originalFile(sha256).catch(() => {
    throw new Problem('not-now', 'The file did not stay. Bring it in once more.', { field: 'file' });
  });
}
