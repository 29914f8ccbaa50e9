import { problemStatus, type ProblemCode } from '#shared/vocabulary/problems.ts';

export type ProblemFacts = {
  /** The field of the request that was wrong, as a path. */
  field?: string;
  /** What was not lost in spite of the refusal. */
  stillHolds?: string;
  /** Every wrong field with its sentence, where there are several. */
  fields?: Record<string, string>;
  /** What stands now, where a stale version was sent. */
  current?: unknown;
};

/** The one refusal of the server: a code from the closed list, a sentence for a person, and the field it speaks of. */
export class Problem extends Error {
  readonly code: ProblemCode;
  readonly facts: ProblemFacts;

  constructor(code: ProblemCode, message: string, facts: ProblemFacts = {}) {
    super(message);
    this.name = 'Problem';
    this.code = code;
    this.facts = facts;
  }

  get status(): number {
    return problemStatus[this.code];
  }
}
