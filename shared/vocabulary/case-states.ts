/** How far a case has come, in order; `withdrawn` is final and off the path. Holding a case is a fact beside its state. */
export const caseStates = ['received', 'examining', 'drafting', 'in review', 'closed', 'withdrawn'] as const;
export type CaseState = (typeof caseStates)[number];

/** States in which the case may still be worked on. */
export const workingStates = ['received', 'examining', 'drafting'] as const satisfies readonly CaseState[];

export const caseKinds = ['service part', 'test specimen', 'specimen set'] as const;
export type CaseKind = (typeof caseKinds)[number];

export const urgencies = ['routine', 'urgent', 'exposed now'] as const;
export type Urgency = (typeof urgencies)[number];

/** How well a background statement stands; a told statement never prints as fact. */
export const standings = ['known', 'told', 'assumed'] as const;
export type Standing = (typeof standings)[number];
