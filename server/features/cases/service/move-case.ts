import { findMove } from '#shared/rules/case-transitions.ts';
import type { CaseState } from '#shared/vocabulary/case-states.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import type { CaseRow } from '../../../rights/queries.ts';
import { updateCase, type CaseValues } from '../queries/cases.ts';
import { changeInCase } from './change-in-case.ts';

/** An analyst moves the case on to examining or drafting, or back. */
export function moveCaseByHand(
  context: Context,
  heldCase: HeldFor<'move'>,
  { to, versionSeen }: { to: 'examining' | 'drafting'; versionSeen: number },
) {
  return changeInCase(context, { heldCase, for: 'move', versionSeen }, (locked, tx) => ({
    act: 'case.moved',
    values: valuesOfMove(locked, to, { at: tx.at, reason: null, act: 'move' }),
    before: { state: locked.state },
    after: { state: to },
  }));
}

/**
 * Moves a case inside another act's transaction: review, sending back, closing. `lockedCase` is what lockCase returned
 * there. @throws Problem wrong-state where the table of moves has none; not-valid where a reason is owed.
 */
export async function moveCase(
  tx: Transaction,
  context: Pick<Context, 'person'>,
  lockedCase: CaseRow,
  to: CaseState,
  { reason = null }: { reason?: string | null } = {},
): Promise<void> {
  await updateCase(tx, lockedCase.id, valuesOfMove(lockedCase, to, { at: tx.at, reason }));
  await recordAct(tx, context.person, {
    act: 'case.moved',
    inCase: lockedCase,
    objectId: lockedCase.id,
    before: { state: lockedCase.state },
    after: { state: to },
    reason,
  });
}

/** What a legal move writes. The act, where given, must be the one the table of moves asks for. */
export function valuesOfMove(
  locked: CaseRow,
  to: CaseState,
  { at, reason, act }: { at: Date; reason: string | null; act?: 'move' | 'withdraw' },
): CaseValues {
  const move = findMove(locked.state, to);
  if (!move || (act && move.act !== act))
    throw new Problem('wrong-state', `A case that is ${locked.state} does not go to ${to}.`, {
      stillHolds: `The case stays ${locked.state}.`,
    });
  if (move.needsReason && !reason?.trim())
    throw new Problem('not-valid', 'Say why; the reason stays with the case.', { field: 'reason' });
  return {
    state: to,
    stateSince: at,
    closedAt: to === 'closed' ? at : null,
    withdrawnReason: to === 'withdrawn' ? reason : null,
  };
}
