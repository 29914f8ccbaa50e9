import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';

export type FourPointRod = {
  /** Total load on both upper rollers, N, ≥ 0. */
  readonly loadN: number;
  /** Lower rollers apart, mm, > 0. */
  readonly outerSpanMm: number;
  /** Upper rollers apart, mm, ≥ 0, < outer span. */
  readonly innerSpanMm: number;
  /** Of the round section, mm, > 0. */
  readonly diameterMm: number;
};

/**
 * Tensile stress on the lowest fibre between the upper rollers, MPa, ≥ 0. Method `bend4.rod`.
 *
 * Holds for a straight, elastic rod of round section with equal arms; shear, roller friction and contact are left out.
 * Exact within beam theory; rounding only.
 * Source: sigma = M c / I with M = F (Lo - Li) / 4, c = D / 2, I = π D⁴ / 64.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, negative-load
 * @example fourPointRodStressMPa({ loadN: 690, outerSpanMm: 40, innerSpanMm: 20, diameterMm: 4 }) // 549.08…
 */
export function fourPointRodStressMPa(rod: FourPointRod): number {
  const { loadN, outerSpanMm, innerSpanMm, diameterMm } = rod;
  requireFinite({ loadN, outerSpanMm, innerSpanMm, diameterMm });
  requirePositive({ diameterMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireNotNegative({ innerSpanMm }, 'negative-inner-span');
  requireThat(innerSpanMm < outerSpanMm, 'inner-span-not-less-than-outer', 'innerSpanMm');
  requireNotNegative({ loadN }, 'negative-load');
  return (8 * loadN * (outerSpanMm - innerSpanMm)) / (Math.PI * diameterMm ** 3);
}
