import type { MissingNoted, PieceView } from '#shared/contracts/evidence.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { presentPiece } from '../present.ts';
import { insertFragment, listFragmentRows } from '../queries.ts';
import { loadPart } from './must-be-there.ts';
import { nextCode } from './next-code.ts';

/** Where a piece that is not there is, and who has it. */
export const nowhere = { place: 'not found', holder: 'no one' } as const;

/** Notes a piece that is not there, why, and whether the origin may lie on it. */
export function noteMissing(
  context: Context,
  heldCase: HeldFor<'change evidence'>,
  noted: MissingNoted,
): Promise<PieceView> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'change evidence');
    await loadPart(tx, heldCase, noted.partId);
    const codes = (await listFragmentRows(tx, heldCase)).map((row) => row.code);
    const row = await insertFragment(tx, {
      ...noted,
      ...nowhere,
      caseId: heldCase.id,
      code: nextCode(codes, { way: 'missing', parentCode: null }),
      way: 'break',
      status: 'missing',
      madeAt: tx.at,
    });
    const piece = presentPiece(row);
    await recordAct(tx, context.person, { act: 'fragment.missed', inCase: heldCase, objectId: piece.id, after: piece });
    return piece;
  });
}
