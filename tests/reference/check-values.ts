import { readFileSync } from 'node:fs';
import { z } from 'zod';

const Quantity = z.object({
  value: z.union([z.number(), z.string(), z.boolean(), z.null(), z.array(z.union([z.number(), z.null()]))]),
  unit: z.string(),
});

const CheckValue = z.object({
  id: z.string(),
  method: z.string(),
  inputs: z.record(z.string(), Quantity),
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

/** The number of an input; NaN where the reference leaves it out (`null`). */
export function numberIn(inputs: CheckValue['inputs'], name: string): number {
  const value = inputs[name]?.value;
  return typeof value === 'number' ? value : Number.NaN;
}
