import { z } from 'zod';
import { problemCodes } from '../vocabulary/problems.ts';

/** What the server answers when it refuses. */
export const ProblemBody = z.object({
  code: z.enum(problemCodes),
  message: z.string(),
  field: z.string().optional(),
  fields: z.record(z.string(), z.string()).optional(),
  stillHolds: z.string().optional(),
  current: z.unknown().optional(),
  reference: z.string().optional(),
});
export type ProblemBody = z.infer<typeof ProblemBody>;
