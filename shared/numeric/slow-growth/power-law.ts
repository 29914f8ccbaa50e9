// Slow crack growth by the power law v = A (K/KIc)^n; each public relation in a file of its own.
import { requireThat } from '../require.ts';

/** The strength relations of the power law hold only for an exponent above 2. */
export function requireGrowthExponent(exponent: number): void {
  requireThat(exponent > 2, 'outside-validity-range', 'exponent');
}
