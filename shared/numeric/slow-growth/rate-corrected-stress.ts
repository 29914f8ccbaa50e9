import { requireFinite, requirePositive } from '../require.ts';
import { requireGrowthExponent } from './power-law.ts';

export type RateChange = {
  /** Fracture stress as tested, MPa, > 0. */
  readonly stressMPa: number;
  /** Stress rate as tested, MPa/s, > 0. */
  readonly rateMPaPerS: number;
  /** Stress rate wanted, MPa/s, > 0. */
  readonly targetRateMPaPerS: number;
  /** Exponent n of slow crack growth, dimensionless, > 2. */
  readonly exponent: number;
};

/**
 * Fracture stress at another stress rate, MPa, > 0. Method `scg.rateCorrection`.
 *
 * Holds while slow growth governs, well below the inert strength. Rounding only.
 * Source: sigma₂ = sigma₁ (rate₂/rate₁)^(1/(n+1)), form of ASTM C1368 (from memory).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-stress, non-positive-rate,
 * outside-validity-range (n ≤ 2)
 * @example rateCorrectedStressMPa({ stressMPa: 85, rateMPaPerS: 1, targetRateMPaPerS: 100, exponent: 16 }) // 111.446…
 */
export function rateCorrectedStressMPa(change: RateChange): number {
  const { stressMPa, rateMPaPerS, targetRateMPaPerS, exponent } = change;
  requireFinite({ stressMPa, rateMPaPerS, targetRateMPaPerS, exponent });
  requirePositive({ stressMPa }, 'non-positive-stress');
  requirePositive({ rateMPaPerS, targetRateMPaPerS }, 'non-positive-rate');
  requireGrowthExponent(exponent);
  return stressMPa * (targetRateMPaPerS / rateMPaPerS) ** (1 / (exponent + 1));
}
