import { requireFinite, requirePositive, requireThat } from '../require.ts';

/**
 * Mean of the moment along a strain gauge over the moment at mid-span of a three-point bar, dimensionless, 0 to 1.
 * Method `gauge.meanMomentRatio3`.
 *
 * `gaugeLengthMm` > 0, `offsetMm` of its middle from mid-span, signed; the whole gauge between the rollers.
 * Source: average of 1 − 2|x|/L; 1 − g/(2L) for a gauge centred at mid-span.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * position-outside-span
 * @example meanMomentRatio({ outerSpanMm: 40, gaugeLengthMm: 1.57, offsetMm: 0 }) // 0.980375
 */
export function meanMomentRatio(gauge: {
  readonly outerSpanMm: number;
  readonly gaugeLengthMm: number;
  readonly offsetMm: number;
}): number {
  const { outerSpanMm, gaugeLengthMm, offsetMm } = gauge;
  requireFinite({ outerSpanMm, gaugeLengthMm, offsetMm });
  requirePositive({ gaugeLengthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  const furtherEndMm = Math.abs(offsetMm) + gaugeLengthMm / 2;
  requireThat(furtherEndMm <= outerSpanMm / 2, 'position-outside-span', 'offsetMm');
  const nearerEndMm = gaugeLengthMm / 2 - Math.abs(offsetMm);
  const crossesMidSpan = nearerEndMm > 0;
  const meanAwayMm = crossesMidSpan ? (furtherEndMm ** 2 + nearerEndMm ** 2) / (2 * gaugeLengthMm) : Math.abs(offsetMm);
  return 1 - (2 * meanAwayMm) / outerSpanMm;
}
