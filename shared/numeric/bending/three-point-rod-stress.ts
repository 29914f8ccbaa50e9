import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';

export type ThreePointRod = {
  /** Load at mid-span, N, ≥ 0. */
  readonly loadN: number;
  /** Lower rollers apart, mm, > 0. */
  readonly outerSpanMm: number;
  /** Of the round section, mm, > 0. */
  readonly diameterMm: number;
};

/**
 * Tensile stress on the lowest fibre at mid-span, MPa, ≥ 0. Method `bend3.rod`.
 *
 * Holds for a straight, elastic rod of round section; shear, roller friction and contact are left out.
 * Exact within beam theory; rounding only.
 * Source: sigma = M c / I with M = F L / 4, c = D / 2, I = π D⁴ / 64.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span, negative-load
 * @example threePointRodStressMPa({ loadN: 420, outerSpanMm: 40, diameterMm: 3.5 }) // 997.80…
 */
export function threePointRodStressMPa(rod: ThreePointRod): number {
  const { loadN, outerSpanMm, diameterMm } = rod;
  requireFinite({ loadN, outerSpanMm, diameterMm });
  requirePositive({ diameterMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireNotNegative({ loadN }, 'negative-load');
  return (8 * loadN * outerSpanMm) / (Math.PI * diameterMm ** 3);
}
