import type { FacesParted, MatePairView } from '#shared/contracts/evidence.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { presentMate } from '../present.ts';
import { findMateRow, updateMate } from '../queries.ts';
import { requireVersion } from './must-be-there.ts';

/** Parts two faces paired by mistake; the pair stays on record. @throws Problem stale-version where it was done already */
export function partFaces(
  context: Context,
  heldCase: HeldFor<'change evidence'>,
  mateId: string,
  { version, reason }: FacesParted,
): Promise<MatePairView> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'change evidence');
    const row = await findMateRow(tx, heldCase, mateId);
    if (!row) throw nothingHere();
    const before = presentMate(row);
    requireVersion(version, before, before);
    await updateMate(tx, mateId, { partedAt: tx.at, version: version + 1 });
    const after = { ...before, partedAt: tx.at.toISOString(), version: version + 1 };
    await recordAct(tx, context.person, {
      act: 'mates.parted',
      inCase: heldCase,
      objectId: mateId,
      before,
      after,
      reason,
    });
    return after;
  });
}
