import { z } from 'zod';
import { verdicts } from '../vocabulary/estimate-lines.ts';
import { CaseNumber } from './ids.ts';

// A page of the Casebook holds 50 cases at most.
const mostNumbers = 50;

/** The cases of a page whose verdicts are asked for: `numbers=HB-2026-0001,HB-2026-0002`. */
export const VerdictsAsked = z.object({
  numbers: z
    .string()
    .transform((text) => text.split(','))
    .pipe(z.array(CaseNumber).min(1).max(mostNumbers)),
});

/** The verdict over the lines in force of each case; a case with no estimate in force, or not to be read, is left out. */
export const CasebookVerdicts = z.array(z.object({ number: CaseNumber, verdict: z.enum(verdicts) }));
export type CasebookVerdicts = z.infer<typeof CasebookVerdicts>;
