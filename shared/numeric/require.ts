import type { RefusalCode } from './refusal-codes.ts';
import { OutsideDomain } from './outside-domain.ts';

type Named = Readonly<Record<string, number>>;

/** Refuses the first number that is missing, NaN or infinite, as `non-finite-input`. */
export function requireFinite(numbers: Named): void {
  for (const [field, value] of Object.entries(numbers)) {
    requireThat(Number.isFinite(value), 'non-finite-input', field);
  }
}

/** Refuses the first number ≤ 0. */
export function requirePositive(numbers: Named, code: RefusalCode): void {
  for (const [field, value] of Object.entries(numbers)) requireThat(value > 0, code, field);
}

/** Refuses the first number < 0. */
export function requireNotNegative(numbers: Named, code: RefusalCode): void {
  for (const [field, value] of Object.entries(numbers)) requireThat(value >= 0, code, field);
}

/** Refuses `field` for the reason `code` unless the condition holds. */
export function requireThat(holds: boolean, code: RefusalCode, field: string): asserts holds {
  if (!holds) throw new OutsideDomain(code, field);
}
