import { dayOf } from '#shared/wording/dates.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import { changeInCase } from './change-in-case.ts';

/** Puts the case on hold for a reason, until a day not yet past. Its state stays where it is. */
export function holdCase(
  context: Context,
  heldCase: HeldFor<'hold'>,
  { reason, until, versionSeen }: { reason: string; until: string; versionSeen: number },
) {
  return changeInCase(context, { heldCase, for: 'hold', versionSeen }, (_locked, tx) => {
    if (until < dayOf(tx.at))
      throw new Problem('not-valid', 'A case is held until today or a later day.', { field: 'until' });
    return {
      act: 'case.held',
      values: { holdReason: reason, holdUntil: until, heldSince: tx.at },
      after: { until },
      reason,
    };
  });
}

/** Takes the case off hold, back to where it was. */
export function resumeCase(context: Context, heldCase: HeldFor<'resume'>, { versionSeen }: { versionSeen: number }) {
  return changeInCase(context, { heldCase, for: 'resume', versionSeen }, (locked) => {
    if (locked.holdReason === null) throw new Problem('wrong-state', 'This case is not on hold.');
    return {
      act: 'case.resumed',
      values: { holdReason: null, holdUntil: null, heldSince: null },
      before: { until: locked.holdUntil, reason: locked.holdReason },
    };
  });
}
