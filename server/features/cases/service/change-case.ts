import type { CaseChanged } from '#shared/contracts/cases.ts';
import type { Context } from '../../../http/context.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import { changeInCase } from './change-in-case.ts';

/** Changes what the case says of itself: title, what happened, kind, urgency, material, scope. */
export function changeCase(context: Context, heldCase: HeldFor<'edit'>, { versionSeen, ...values }: CaseChanged) {
  return changeInCase(context, { heldCase, for: 'edit', versionSeen }, (locked) => {
    const { title, summary, kind, urgency, materialId, scope } = locked;
    return {
      act: 'case.changed',
      values,
      before: { title, summary, kind, urgency, materialId, scope },
      after: { title, summary, kind, urgency, materialId, scope, ...values },
    };
  });
}
