import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { bisect } from '../special-functions/bisect.ts';
import { requireGrowthExponent } from './power-law.ts';

export type ConstantRate = {
  /** Strength without slow growth, MPa, > 0. */
  readonly inertStrengthMPa: number;
  /** B = 2 KIc² / [A Y² (n − 2)], MPa²·s, > 0. */
  readonly growthConstantMPa2S: number;
  /** Exponent n, dimensionless, > 2. */
  readonly exponent: number;
  /** Stress rate, MPa/s, > 0. */
  readonly rateMPaPerS: number;
};

export type GrownStrength = {
  /** Fracture stress at that rate, MPa, > 0, at most the inert strength. */
  readonly stressMPa: number;
  /** Apparent over true toughness, read from the first flaw, dimensionless, 0 to 1. */
  readonly apparentToughnessRatio: number;
  /** Last over first flaw size, dimensionless, ≥ 1. */
  readonly flawGrowthRatio: number;
};

/**
 * Fracture stress at a constant stress rate with slow crack growth, without the usual shortening. Method
 * `scg.fullConstantRate`.
 *
 * Holds for the power law from the first load on, at any rate. Solved to the last digit.
 * Source: sigma^(n+1) = B (n+1) rate (Si^(n−2) − sigma^(n−2)), checked against direct integration.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-stress, outside-validity-range (B ≤ 0,
 * n ≤ 2), non-positive-rate
 * @example constantRateStrength({ inertStrengthMPa: 106.15, growthConstantMPa2S: 4.829, exponent: 16, rateMPaPerS: 10 }).stressMPa // 69.145…
 */
export function constantRateStrength(test: ConstantRate): GrownStrength {
  const { inertStrengthMPa, growthConstantMPa2S, exponent, rateMPaPerS } = test;
  requireFinite({ inertStrengthMPa, growthConstantMPa2S, exponent, rateMPaPerS });
  requirePositive({ inertStrengthMPa }, 'non-positive-stress');
  requireThat(growthConstantMPa2S > 0, 'outside-validity-range', 'growthConstantMPa2S');
  requireGrowthExponent(exponent);
  requirePositive({ rateMPaPerS }, 'non-positive-rate');
  // by the ratio to the inert strength, since Si^(n−2) leaves the range of numbers at a large n
  const drive = (growthConstantMPa2S * (exponent + 1) * rateMPaPerS) / inertStrengthMPa ** 3;
  const ratio = bisect({
    from: 0,
    to: 1,
    of: (part) => part ** (exponent + 1) - drive * (1 - part ** (exponent - 2)),
  });
  return { stressMPa: ratio * inertStrengthMPa, apparentToughnessRatio: ratio, flawGrowthRatio: ratio ** -2 };
}
