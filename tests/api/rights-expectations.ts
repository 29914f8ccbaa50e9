import type { CaseAct, LaboratoryAct } from '#shared/rules/may.ts';

/** The people of the test laboratory, and someone who has not signed in. */
export const everyone = [
  'visitor',
  'analyst',
  'engineer',
  'manager',
  'administrator',
  'makerEngineer',
  'requester',
  'outsider',
] as const;
export type Someone = (typeof everyone)[number];

/** Written by hand from the table of roles, not derived from the rule that it tests. */
export const mayInCase: Record<CaseAct, readonly Someone[]> = {
  read: ['analyst', 'engineer', 'manager'],
  follow: ['analyst', 'engineer', 'manager', 'makerEngineer', 'requester'],
  edit: ['analyst'],
  take: ['analyst'],
  assign: ['manager'],
  move: ['analyst'],
  hold: ['analyst', 'manager'],
  resume: ['analyst', 'manager'],
  withdraw: ['analyst', 'manager'],
  restrict: ['manager'],
  'change evidence': ['analyst'],
  'bring in fractographs': ['analyst'],
  calibrate: ['analyst'],
  mark: ['analyst'],
  estimate: ['analyst'],
  'write findings': ['analyst', 'engineer'],
  'send to review': ['analyst'],
  'send back': ['manager'],
  'accept a note': ['manager'],
  'sign as authored': ['analyst'],
  'sign as checked': ['analyst'],
  'sign as approved': ['manager'],
};

export const mayOutsideCases: Record<LaboratoryAct, readonly Someone[]> = {
  'see the casebook': ['analyst', 'engineer', 'manager', 'administrator', 'makerEngineer', 'requester', 'outsider'],
  'open a case': ['analyst'],
  'read materials': ['analyst', 'engineer', 'manager', 'makerEngineer'],
  'enter materials': ['analyst', 'engineer'],
  'record constants': ['engineer'],
  'read calibrations': ['analyst', 'engineer', 'manager', 'administrator'],
  'record calibrations': ['analyst', 'administrator'],
  'read people': ['analyst', 'engineer', 'manager', 'administrator'],
  'keep people': ['administrator'],
  'read mail': ['administrator'],
  'read the trail': ['administrator'],
  reckon: ['analyst', 'engineer', 'manager', 'makerEngineer'],
};

/** Who knows that the case is there at all; to the others it is as if it were not. */
export const sees = {
  'a case of the maker': ['analyst', 'engineer', 'manager', 'makerEngineer', 'requester'],
  'a case of another firm': ['analyst', 'engineer', 'manager', 'outsider'],
  'a restricted case of the maker': ['analyst', 'manager', 'makerEngineer', 'requester'],
} as const satisfies Record<string, readonly Someone[]>;
export type CaseSeen = keyof typeof sees;

/** Of another firm's case its own people are requesters too. */
export const followers: readonly Someone[] = ['makerEngineer', 'requester', 'outsider'];
