import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { requireGrowthExponent } from './power-law.ts';

export type ConstantStress = {
  /** Strength without slow growth, MPa, > 0. */
  readonly inertStrengthMPa: number;
  /** B = 2 KIc² / [A Y² (n − 2)], MPa²·s, > 0. */
  readonly growthConstantMPa2S: number;
  /** Exponent n, dimensionless, > 2. */
  readonly exponent: number;
  /** Constant stress, MPa, > 0, less than the inert strength. */
  readonly stressMPa: number;
};

/**
 * Time to fracture under a constant stress with slow crack growth, s, > 0. Method `scg.staticLife`.
 *
 * Holds for a stress well below the inert strength; the last part, B/sigma², is left out.
 * Source: t = B Si^(n−2) sigma^(−n).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-stress, outside-validity-range (B ≤ 0,
 * n ≤ 2, a stress at or above the inert strength)
 * @example staticLifeS({ inertStrengthMPa: 100, growthConstantMPa2S: 0.5, exponent: 16, stressMPa: 50 }) // 3.2768
 */
export function staticLifeS(hold: ConstantStress): number {
  const { inertStrengthMPa, growthConstantMPa2S, exponent, stressMPa } = hold;
  requireFinite({ inertStrengthMPa, growthConstantMPa2S, exponent, stressMPa });
  requirePositive({ inertStrengthMPa, stressMPa }, 'non-positive-stress');
  requireThat(growthConstantMPa2S > 0, 'outside-validity-range', 'growthConstantMPa2S');
  requireGrowthExponent(exponent);
  requireThat(stressMPa < inertStrengthMPa, 'outside-validity-range', 'stressMPa');
  return (growthConstantMPa2S / stressMPa ** 2) * (inertStrengthMPa / stressMPa) ** (exponent - 2);
}
