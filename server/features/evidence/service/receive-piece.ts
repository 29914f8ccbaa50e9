import type { PieceReceived, PieceView } from '#shared/contracts/evidence.ts';
import type { Transaction } from '../../../database/connection.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { presentPiece } from '../present.ts';
import { insertFragment, listFragmentRows } from '../queries.ts';
import { loadFragment, loadPart } from './must-be-there.ts';
import { nextCode } from './next-code.ts';
import { readMass } from './read-mass.ts';

/**
 * Receives a piece and gives it its code, without gap or duplicate: the case row is locked meanwhile.
 * @throws Problem not-valid for a mass that cannot be read, or a parent that is not there to be cut or replicated
 */
export function receivePiece(
  context: Context,
  heldCase: HeldFor<'change evidence'>,
  received: PieceReceived,
): Promise<PieceView> {
  const { mass, ...lines } = received;
  const massRead = readMass(mass);
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'change evidence');
    await loadPart(tx, heldCase, received.partId);
    const parentCode = await findParentCode(tx, heldCase, received);
    const codes = (await listFragmentRows(tx, heldCase)).map((row) => row.code);
    const row = await insertFragment(tx, {
      ...lines,
      ...massRead,
      caseId: heldCase.id,
      code: nextCode(codes, { way: received.way, parentCode }),
      status: 'present',
      madeAt: tx.at,
    });
    const piece = presentPiece(row);
    await recordAct(tx, context.person, {
      act: 'fragment.received',
      inCase: heldCase,
      objectId: piece.id,
      after: piece,
    });
    return piece;
  });
}

async function findParentCode(
  tx: Transaction,
  heldCase: HeldFor<'change evidence'>,
  { parentId, partId }: PieceReceived,
): Promise<string | null> {
  if (parentId === null) return null;
  const parent = await loadFragment(tx, heldCase, parentId);
  if (parent.partId !== partId)
    throw new Problem('not-valid', `${parent.code} is a piece of another part.`, { field: 'parentId' });
  if (parent.status === 'missing')
    throw new Problem('not-valid', `${parent.code} is not there, so nothing can be made from it.`, {
      field: 'parentId',
    });
  return parent.code;
}
