import { requireFinite, requirePositive } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

// Part of the nominal stress times depth over span: exact elastic strip under a point load, Fourier integral taken
// numerically. A handbook constant is remembered as 0.1773.
const wedging = 0.17426;

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
  return (-wedging * depthMm) / outerSpanMm;
}

/**
 * As `threePointWedgingError`, opposite an inner roller of a four-point bar, which bears half the load.
 * Method `error.wedging4`.
 *
 * Source: the same strip with F/2 at the roller and the moment Fa/2, a = (Lo − Li)/2: −0.0436 d/a.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer
 * @example fourPointWedgingError({ depthMm: 3, outerSpanMm: 40, innerSpanMm: 20 }) // −0.01307
 */
export function fourPointWedgingError(bar: FourPointSpans & { readonly depthMm: number }): number {
  const { depthMm, outerSpanMm, innerSpanMm } = bar;
  requireFinite({ depthMm, outerSpanMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  return (-wedging * depthMm) / (4 * momentArmMm(bar));
}
