import type { CaseRestricted } from '#shared/contracts/cases.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import { replaceNamedPeople } from '../queries/cases.ts';
import { listStaff } from '../queries/choices.ts';
import { changeInCase } from './change-in-case.ts';

/**
 * Puts a wall round the case, or takes it down. Behind it only the people named see the case; who builds it and who
 * holds the case are always named, so that it is never out of everyone's sight.
 */
export function restrictCase(
  context: Context,
  heldCase: HeldFor<'restrict'>,
  { restricted, namedPersonIds, versionSeen }: CaseRestricted,
) {
  return changeInCase(context, { heldCase, for: 'restrict', versionSeen }, async (locked, tx) => {
    const staff = await listStaff(tx, ['analyst', 'engineer', 'manager']);
    const wanted = [context.person.id, ...(locked.assignedTo ? [locked.assignedTo] : []), ...namedPersonIds];
    const named = restricted ? [...new Set(wanted)] : [];
    const names = named.map((personId) => staff.find(({ id }) => id === personId)?.name);
    if (names.includes(undefined))
      throw new Problem('not-valid', 'Only people of the laboratory with an open account are named on a case.', {
        field: 'namedPersonIds',
      });
    await replaceNamedPeople(tx, locked.id, named);
    return {
      act: 'case.restricted',
      values: { restricted },
      before: { restricted: locked.restricted, namedPersonIds: locked.namedPersonIds },
      after: { restricted, namedPersonIds: named },
    };
  });
}
