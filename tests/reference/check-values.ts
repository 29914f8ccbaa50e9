import { readFileSync } from 'node:fs';
import { z } from 'zod';
import { ReckoningWanted } from '#shared/contracts/reckonings.ts';

const CheckValue = ReckoningWanted.extend({
  expected: z.record(z.string(), z.object({ value: z.unknown(), unit: z.string() })),
  tolerance: z.object({ rel: z.number().optional(), abs: z.number().optional() }),
  source: z.string(),
});
export type CheckValue = z.infer<typeof CheckValue>;

/**
 * The reference values, made by another program (mpmath, central differences) or taken from printed worked examples; each
 * says which.
 */
export const checkValues = z
  .array(CheckValue)
  .parse(JSON.parse(readFileSync(new URL('./check-values.json', import.meta.url), 'utf8')));

/** Numbers within the tolerance of the entry (its printed digits); words, yes and no, and all else exactly. */
export function agrees(found: unknown, wanted: unknown, tolerance: CheckValue['tolerance']): boolean {
  if (typeof wanted !== 'number') return JSON.stringify(found) === JSON.stringify(wanted);
  if (typeof found !== 'number') return false;
  return Math.abs(found - wanted) <= (tolerance.rel ?? 0) * Math.abs(wanted) + (tolerance.abs ?? 0);
}
