import type { Person } from '../contracts/people.ts';
import { type CaseState, workingStates } from '../vocabulary/case-states.ts';
import type { Role } from '../vocabulary/roles.ts';

/** The facts of a case that decide who may do what in it. */
export type CaseFacts = {
  readonly state: CaseState;
  readonly onHold: boolean;
  readonly organisationId: string;
  readonly restricted: boolean;
  readonly namedPersonIds: readonly string[];
  readonly assignedTo: string | null;
  readonly authorIds: readonly string[];
};

export type Answer = { readonly allowed: true } | { readonly allowed: false; readonly reason: string };

type CaseActRow = {
  readonly roles: readonly Role[];
  /** States the case must be in; 'working' is received, examining or drafting and not on hold. */
  readonly states: readonly CaseState[] | 'working' | 'any';
  /** What the act is called in a refusal: "open a bench", "sign as approved". */
  readonly words: string;
  /** Set where a case on hold allows the act all the same. */
  readonly onHold?: true;
  readonly authors?: 'only' | 'never';
};

const notClosed = ['received', 'examining', 'drafting', 'in review'] as const;

/** Every act in a case: who may, and when. */
export const caseActTable = {
  read: { roles: ['analyst', 'manager', 'engineer'], states: 'any', onHold: true, words: 'read this case' },
  follow: {
    roles: ['analyst', 'manager', 'engineer', 'requester'],
    states: 'any',
    onHold: true,
    words: 'follow this case',
  },
  edit: { roles: ['analyst'], states: 'working', words: 'change what was asked and what is known' },
  take: { roles: ['analyst'], states: notClosed, words: 'take this case' },
  assign: { roles: ['manager'], states: notClosed, onHold: true, words: 'give this case to someone' },
  move: { roles: ['analyst'], states: 'working', words: 'move this case on' },
  hold: { roles: ['analyst', 'manager'], states: notClosed, words: 'put this case on hold' },
  resume: { roles: ['analyst', 'manager'], states: notClosed, onHold: true, words: 'take this case off hold' },
  withdraw: { roles: ['analyst', 'manager'], states: notClosed, onHold: true, words: 'withdraw this case' },
  restrict: { roles: ['manager'], states: 'any', onHold: true, words: 'restrict who sees this case' },
  'change evidence': { roles: ['analyst'], states: 'working', words: 'change the pieces of this case' },
  'bring in fractographs': { roles: ['analyst'], states: 'working', words: 'bring in fractographs' },
  calibrate: { roles: ['analyst'], states: 'working', words: 'give an image its scale' },
  mark: { roles: ['analyst'], states: 'working', words: 'mark a fractograph' },
  estimate: { roles: ['analyst'], states: 'working', words: 'estimate a stress' },
  'write findings': { roles: ['analyst', 'engineer'], states: 'working', words: 'write in the findings' },
  'send to review': { roles: ['analyst'], states: ['drafting'], words: 'send this case to review' },
  'send back': { roles: ['manager'], states: ['in review'], words: 'send this case back' },
  'accept a note': { roles: ['manager'], states: ['in review'], words: 'accept a note of the readiness list' },
  'sign as authored': {
    roles: ['analyst'],
    states: ['drafting', 'in review'],
    authors: 'only',
    words: 'sign as authored',
  },
  'sign as checked': { roles: ['analyst'], states: ['in review'], authors: 'never', words: 'sign as checked' },
  'sign as approved': { roles: ['manager'], states: ['in review'], authors: 'never', words: 'sign as approved' },
} as const satisfies Record<string, CaseActRow>;

export type CaseAct = keyof typeof caseActTable;
export const caseActs = Object.keys(caseActTable) as CaseAct[];

/** Acts outside a case: the roles that may, and whether only the laboratory's own people hold them. */
export const laboratoryActTable = {
  'see the casebook': {
    roles: ['analyst', 'manager', 'engineer', 'requester', 'administrator'],
    laboratory: false,
    words: 'see the Casebook',
  },
  'open a case': { roles: ['analyst'], laboratory: true, words: 'open a case' },
  'read materials': { roles: ['analyst', 'manager', 'engineer'], laboratory: false, words: 'read the materials' },
  'enter materials': { roles: ['analyst', 'engineer'], laboratory: true, words: 'enter a material' },
  'record constants': { roles: ['engineer'], laboratory: true, words: 'record a constant used in estimates' },
  'read calibrations': {
    roles: ['analyst', 'manager', 'engineer', 'administrator'],
    laboratory: true,
    words: 'read the calibrations',
  },
  'record calibrations': { roles: ['analyst', 'administrator'], laboratory: true, words: 'record a calibration' },
  'read people': {
    roles: ['analyst', 'manager', 'engineer', 'administrator'],
    laboratory: true,
    words: 'read who is here',
  },
  'keep people': { roles: ['administrator'], laboratory: true, words: 'invite people and change accounts' },
  'read mail': { roles: ['administrator'], laboratory: true, words: 'read the outgoing mail' },
  'read the trail': { roles: ['administrator'], laboratory: true, words: 'read the audit trail' },
  reckon: { roles: ['analyst', 'manager', 'engineer'], laboratory: false, words: 'reckon outside a case' },
} as const satisfies Record<string, { roles: readonly Role[]; laboratory: boolean; words: string }>;

export type LaboratoryAct = keyof typeof laboratoryActTable;
export const laboratoryActs = Object.keys(laboratoryActTable) as LaboratoryAct[];

/** May this person do the act, outside any case? */
export function mayInLaboratory(person: Person, act: LaboratoryAct): Answer {
  const row: { roles: readonly Role[]; laboratory: boolean; words: string } = laboratoryActTable[act];
  if (!holdsOneOf(person, row.roles)) return refused(`Only ${listed(row.roles.map(withArticle))} may ${row.words}.`);
  if (row.laboratory && person.organisationKind !== 'laboratory')
    return refused(`Only the laboratory's own people may ${row.words}.`);
  return allowed;
}

/**
 * May this person know that the case is there at all? Staff of the laboratory see every case not restricted, a
 * restricted one only its named people; others only cases of their own organisation, as its requester would.
 */
export function seesCase(person: Person, facts: CaseFacts): boolean {
  if (person.organisationKind !== 'laboratory')
    return facts.organisationId === person.organisationId && holdsOneOf(person, ['requester', 'engineer']);
  if (!holdsOneOf(person, ['analyst', 'manager', 'engineer'])) return false;
  return !facts.restricted || facts.namedPersonIds.includes(person.id);
}

/** May this person, who sees the case, do the act in it now? The reason of a refusal is a sentence for that person. */
export function may(person: Person, act: CaseAct, facts: CaseFacts): Answer {
  const row: CaseActRow = caseActTable[act];
  if (!seesCase(person, facts)) return refused('There is nothing here for you.');
  if (!holdsOneOf(person, row.roles)) return refused(`Only ${listed(row.roles.map(withArticle))} may ${row.words}.`);
  if (person.organisationKind !== 'laboratory' && act !== 'follow')
    return refused(`Only the laboratory's own people may ${row.words}.`);
  return mayNow(person, row, facts);
}

function mayNow(person: Person, row: CaseActRow, facts: CaseFacts): Answer {
  if (facts.onHold && !row.onHold) return refused(`This case is on hold; take it off hold to ${row.words}.`);
  const states = row.states === 'working' ? workingStates : row.states;
  if (states !== 'any' && facts.state === 'closed')
    return refused('This case is closed and sealed; it changes only by amendment.');
  if (states !== 'any' && facts.state === 'withdrawn') return refused('This case is withdrawn; nothing in it changes.');
  if (states !== 'any' && !states.some((state) => state === facts.state))
    return refused(`This case is ${facts.state}; one can ${row.words} while it is ${listed(states)}.`);
  const isAuthor = facts.authorIds.includes(person.id);
  if (row.authors === 'only' && !isAuthor) return refused('Only who worked on this case signs it as authored.');
  if (row.authors === 'never' && isAuthor)
    return refused(`You worked on this case, so someone else must ${row.words}.`);
  return allowed;
}

const allowed: Answer = { allowed: true };
const refused = (reason: string): Answer => ({ allowed: false, reason });

function holdsOneOf(person: Person, roles: readonly Role[]): boolean {
  return roles.some((role) => person.roles.includes(role));
}

const withArticle = (role: Role) => `${/^[aeiou]/.test(role) ? 'an' : 'a'} ${role}`;

function listed(words: readonly string[]): string {
  return words.length < 2 ? (words[0] ?? 'no one') : `${words.slice(0, -1).join(', ')} or ${words.at(-1)}`;
}
