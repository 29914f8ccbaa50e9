import { requireFinite, requirePositive } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';
import { wedgingOfStrip } from './three-point-wedging-error.ts';

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
  return (-wedgingOfStrip * depthMm) / (4 * momentArmMm(bar));
}
