import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import { listStaff } from '../queries/choices.ts';
import { changeInCase } from './change-in-case.ts';

/** Gives the case to an analyst of the laboratory, or to no one. */
export function giveCase(
  context: Context,
  heldCase: HeldFor<'assign'>,
  { personId, versionSeen }: { personId: string | null; versionSeen: number },
) {
  return changeInCase(context, { heldCase, for: 'assign', versionSeen }, async (locked, tx) => {
    const holder = personId === null ? null : (await listStaff(tx, ['analyst'])).find(({ id }) => id === personId);
    if (holder === undefined)
      throw new Problem('not-valid', 'A case is given to an analyst of the laboratory with an open account.', {
        field: 'personId',
      });
    if (holder && locked.restricted && !locked.namedPersonIds.includes(holder.id))
      throw new Problem('not-valid', `This case is restricted; name ${holder.name} on it before giving it to them.`, {
        field: 'personId',
      });
    return {
      act: 'case.assigned',
      values: { assignedTo: personId },
      before: { assignedTo: locked.assignedTo },
      after: { assignedTo: personId, name: holder?.name ?? 'no one' },
    };
  });
}

/** An analyst takes the case themself. */
export function takeCase(context: Context, heldCase: HeldFor<'take'>, { versionSeen }: { versionSeen: number }) {
  return changeInCase(context, { heldCase, for: 'take', versionSeen }, (locked) => ({
    act: 'case.taken',
    values: { assignedTo: context.person.id },
    before: { assignedTo: locked.assignedTo },
    after: { assignedTo: context.person.id },
  }));
}
