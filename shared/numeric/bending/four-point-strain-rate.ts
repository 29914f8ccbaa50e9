import { requireFinite, requirePositive } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';
import { secondsPerMinute, type DrivenBar } from './three-point-strain-rate.ts';

/**
 * Strain rate of the outer fibre between the inner rollers of a four-point bar, 1/s. Method `strainRate.crosshead4`.
 *
 * Holds for a rigid machine, small deflection and equal arms; a machine that gives makes it lower.
 * Source: beam theory with a = (Lo − Li)/2, 3ds/[a(3Lo − 4a)]: the crosshead goes with the inner rollers.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, non-positive-rate
 * @example fourPointStrainRatePerS({ depthMm: 1.5, crossheadMmPerMin: 0.2, outerSpanMm: 20, innerSpanMm: 10 }) // 7.5e-5
 */
export function fourPointStrainRatePerS(bar: DrivenBar & FourPointSpans): number {
  const { depthMm, crossheadMmPerMin, outerSpanMm, innerSpanMm } = bar;
  requireFinite({ depthMm, crossheadMmPerMin, outerSpanMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  requirePositive({ crossheadMmPerMin }, 'non-positive-rate');
  const armMm = momentArmMm(bar);
  return (3 * depthMm * (crossheadMmPerMin / secondsPerMinute)) / (armMm * (3 * outerSpanMm - 4 * armMm));
}
