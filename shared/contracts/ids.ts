import { z } from 'zod';

export const PersonId = z.uuid().brand<'PersonId'>();
export type PersonId = z.infer<typeof PersonId>;
export const CaseId = z.uuid().brand<'CaseId'>();
export type CaseId = z.infer<typeof CaseId>;
export const CaseNumber = z
  .string()
  .regex(/^HB-\d{4}-\d{4,}$/, 'A case number reads HB-2026-0001.')
  .brand<'CaseNumber'>();
export type CaseNumber = z.infer<typeof CaseNumber>;
export const FractographId = z.uuid().brand<'FractographId'>();
export type FractographId = z.infer<typeof FractographId>;

/** The `:number` of a case route. */
export const CasePath = z.object({ number: CaseNumber });
