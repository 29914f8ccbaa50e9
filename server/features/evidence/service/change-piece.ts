import type { PieceChange, PieceView } from '#shared/contracts/evidence.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { presentPiece } from '../present.ts';
import { updateFragment } from '../queries.ts';
import { loadFragment, requireVersion } from './must-be-there.ts';
import { nowhere } from './note-missing.ts';
import { readMass } from './read-mass.ts';

/**
 * Changes what is known of a piece; a missing one that turns up keeps its code.
 * @throws Problem stale-version with the piece as it stands now
 */
export function changePiece(
  context: Context,
  heldCase: HeldFor<'change evidence'>,
  pieceId: string,
  change: PieceChange,
): Promise<PieceView> {
  const massRead = readMass(change.mass);
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'change evidence');
    const before = presentPiece(await loadFragment(tx, heldCase, pieceId));
    requireVersion(change.version, before, before);
    const { description, condition, receivedOn } = change;
    const row = await updateFragment(tx, pieceId, {
      description,
      condition,
      receivedOn,
      ...massRead,
      ...whereItIs(change.how),
      version: before.version + 1,
    });
    const after = presentPiece(row);
    await recordAct(tx, context.person, {
      act: 'fragment.changed',
      inCase: heldCase,
      objectId: pieceId,
      before,
      after,
    });
    return after;
  });
}

function whereItIs(how: PieceChange['how']) {
  return how.status === 'missing' ? { ...how, ...nowhere } : { ...how, missingReason: null, originLies: null };
}
