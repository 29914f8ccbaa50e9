import { caseActs } from './acts/cases.ts';
import { closureActs } from './acts/closure.ts';
import { estimateActs } from './acts/estimates.ts';
import { evidenceActs } from './acts/evidence.ts';
import { findingsActs } from './acts/findings.ts';
import { fractographActs } from './acts/fractographs.ts';
import { markActs } from './acts/marks.ts';
import { materialActs } from './acts/materials.ts';
import { peopleActs } from './acts/people.ts';

export type ActRow = {
  /** What the trail says the person did: "drew mark m3". */
  readonly words: string;
  /** Set where a kept act of this kind makes the person an author of the case. */
  readonly authorship?: true;
};

/** Every kind of act that is ever recorded. A kind once stored is never changed; a new form gets a name ending in @2. */
export const actTable = {
  ...peopleActs,
  ...materialActs,
  ...caseActs,
  ...evidenceActs,
  ...fractographActs,
  ...markActs,
  ...estimateActs,
  ...findingsActs,
  ...closureActs,
} as const satisfies Record<string, ActRow>;

export type ActName = keyof typeof actTable;
