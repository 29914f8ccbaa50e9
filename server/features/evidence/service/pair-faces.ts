import type { FacesPaired, MatePairView } from '#shared/contracts/evidence.ts';
import type { Transaction } from '../../../database/connection.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { presentMate } from '../present.ts';
import { findMateRow, findPairOfFace, insertMate } from '../queries.ts';
import { loadFragment } from './must-be-there.ts';

/**
 * Pairs two faces that were one before the break. The case row is locked meanwhile, so a face is in one pair at most.
 * @throws Problem already-there, with the pair as it stands, where a face has its mate already
 */
export function pairFaces(
  context: Context,
  heldCase: HeldFor<'change evidence'>,
  { one, other, crack }: FacesPaired,
): Promise<MatePairView> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'change evidence');
    await requireFree(tx, heldCase, one, 'one');
    await requireFree(tx, heldCase, other, 'other');
    const { id } = await insertMate(tx, {
      caseId: heldCase.id,
      fragmentId: one.fragmentId,
      face: one.face,
      mateFragmentId: other.fragmentId,
      mateFace: other.face,
      crack,
      pairedBy: context.person.id,
      pairedAt: tx.at,
    });
    const row = await findMateRow(tx, heldCase, id);
    if (!row) throw nothingHere();
    const pair = presentMate(row);
    await recordAct(tx, context.person, { act: 'mates.paired', inCase: heldCase, objectId: id, after: pair });
    return pair;
  });
}

async function requireFree(
  tx: Transaction,
  heldCase: HeldFor<'change evidence'>,
  { fragmentId, face }: FacesPaired['one'],
  field: 'one' | 'other',
): Promise<void> {
  const { code } = await loadFragment(tx, heldCase, fragmentId);
  const row = await findPairOfFace(tx, heldCase.id, fragmentId, face);
  if (!row) return;
  const pair = presentMate(row);
  const mate = pair.one.fragmentId === fragmentId && pair.one.face === face ? pair.other : pair.one;
  throw new Problem(
    'already-there',
    `Face ${face} of ${code} is paired with face ${mate.face} of ${mate.code} already; part them first.`,
    { field, current: pair },
  );
}
