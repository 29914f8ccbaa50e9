import type { Context } from '../../../http/context.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import { changeInCase } from './change-in-case.ts';
import { valuesOfMove } from './move-case.ts';

/** Withdraws the case for good. A hold ends with it; the reason stays. */
export function withdrawCase(
  context: Context,
  heldCase: HeldFor<'withdraw'>,
  { reason, versionSeen }: { reason: string; versionSeen: number },
) {
  return changeInCase(context, { heldCase, for: 'withdraw', versionSeen }, (locked, tx) => ({
    act: 'case.withdrawn',
    values: {
      ...valuesOfMove(locked, 'withdrawn', { at: tx.at, reason, act: 'withdraw' }),
      ...{ holdReason: null, holdUntil: null, heldSince: null },
    },
    before: { state: locked.state },
    after: { state: 'withdrawn' },
    reason,
  }));
}
