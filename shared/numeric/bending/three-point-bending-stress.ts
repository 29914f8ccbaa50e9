import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';

export type ThreePointBar = {
  /** Load at mid-span, N, ≥ 0. */
  readonly loadN: number;
  /** Lower rollers apart, mm, > 0. */
  readonly outerSpanMm: number;
  /** Section across the load, mm, > 0. */
  readonly widthMm: number;
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
};

/**
 * Tensile stress on the outer face at mid-span, MPa, ≥ 0. Method `bend3.rect`.
 *
 * Holds for a straight, elastic bar of rectangular section; shear, roller friction and wedging are left out.
 * Exact within beam theory; rounding only.
 * Source: sigma = M c / I with M = F L / 4, c = d / 2, I = b d³ / 12.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span, negative-load
 * @example threePointBendingStressMPa({ loadN: 612.5, outerSpanMm: 40, widthMm: 4, depthMm: 3 }) // 1020.83…
 */
export function threePointBendingStressMPa(bar: ThreePointBar): number {
  const { loadN, outerSpanMm, widthMm, depthMm } = bar;
  requireFinite({ loadN, outerSpanMm, widthMm, depthMm });
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireNotNegative({ loadN }, 'negative-load');
  return (3 * loadN * outerSpanMm) / (2 * widthMm * depthMm ** 2);
}
