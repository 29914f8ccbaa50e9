import type { CaseView } from '#shared/contracts/cases.ts';
import type { Person } from '#shared/contracts/people.ts';
import { caseActs, caseActTable, may, type Answer, type CaseAct, type CaseFacts } from '#shared/rules/may.ts';
import type { Role } from '#shared/vocabulary/roles.ts';

export type ActsInCase = Readonly<Record<CaseAct, Answer>>;

/** What decides over rights in a case, as the page knows it. */
export function factsOfView(view: CaseView): CaseFacts {
  return {
    state: view.state,
    onHold: view.hold !== null,
    organisationId: view.organisation.id,
    restricted: view.restricted,
    namedPersonIds: view.namedPeople.map(({ id }) => id),
    assignedTo: view.assignedTo?.id ?? null,
    authorIds: view.authorIds,
  };
}

/** Every act of a case with whether this person may do it now, and the reason if not. */
export function actsInCase(person: Person, view: CaseView): ActsInCase {
  const facts = factsOfView(view);
  return Object.fromEntries(caseActs.map((act) => [act, may(person, act, facts)])) as ActsInCase; // brand: one entry an act
}

/** Whether the act belongs to one of the person's roles at all; what does not is left out, not refused. */
export function belongsToRole(person: Person, act: CaseAct): boolean {
  const roles: readonly Role[] = caseActTable[act].roles;
  return roles.some((role) => person.roles.includes(role));
}
