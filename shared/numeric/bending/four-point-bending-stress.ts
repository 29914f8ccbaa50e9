import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';

export type FourPointBar = {
  /** Total load on both upper rollers, N, ≥ 0. */
  readonly loadN: number;
  /** Lower rollers apart, mm, > 0. */
  readonly outerSpanMm: number;
  /** Upper rollers apart, mm, ≥ 0, < outer span. */
  readonly innerSpanMm: number;
  /** Section across the load, mm, > 0. */
  readonly widthMm: number;
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
};

/**
 * Tensile stress on the outer face between the upper rollers, MPa, ≥ 0. Method `bend4.rect`.
 *
 * Holds for a straight, elastic bar of rectangular section with equal arms; shear, roller friction and wedging are left out.
 * Exact within beam theory; rounding only.
 * Source: sigma = M c / I with M = F (Lo - Li) / 4, c = d / 2, I = b d³ / 12.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, negative-load
 * @example fourPointBendingStressMPa({ loadN: 412, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3 }) // 343.33…
 */
export function fourPointBendingStressMPa(bar: FourPointBar): number {
  const { loadN, outerSpanMm, innerSpanMm, widthMm, depthMm } = bar;
  requireFinite({ loadN, outerSpanMm, innerSpanMm, widthMm, depthMm });
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireNotNegative({ innerSpanMm }, 'negative-inner-span');
  requireThat(innerSpanMm < outerSpanMm, 'inner-span-not-less-than-outer', 'innerSpanMm');
  requireNotNegative({ loadN }, 'negative-load');
  return (3 * loadN * (outerSpanMm - innerSpanMm)) / (2 * widthMm * depthMm ** 2);
}
