import { requireFinite, requirePositive } from '../require.ts';

// Part of the nominal stress times depth over span: exact elastic strip under a point load, Fourier integral taken
// numerically. A handbook constant is remembered as 0.1773.
export const wedgingOfStrip = 0.17426;

/**
 * Relative error of the stress on the tensile face right opposite a three-point loading roller, dimensionless, < 0: the true
 * stress is lower. Method `error.wedging3`.
 *
 * Source: exact strip, −0.1743 d/L.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span
 * @example threePointWedgingError({ depthMm: 3, outerSpanMm: 40 }) // −0.01307
 */
export function threePointWedgingError(bar: { readonly depthMm: number; readonly outerSpanMm: number }): number {
  const { depthMm, outerSpanMm } = bar;
  requireFinite({ depthMm, outerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  return (-wedgingOfStrip * depthMm) / outerSpanMm;
}
