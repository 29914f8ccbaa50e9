import { requireFinite, requirePositive } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

type Driven = {
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
  /** Of the crosshead, mm/min, > 0. */
  readonly crossheadMmPerMin: number;
};

const secondsPerMinute = 60;

/**
 * Strain rate of the outer fibre at mid-span of a three-point bar, 1/s. Method `strainRate.crosshead3`.
 *
 * Holds for a rigid machine and small deflection; a machine that gives makes it lower.
 * Source: beam theory, 6ds/L².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * non-positive-rate
 * @example threePointStrainRatePerS({ depthMm: 3, crossheadMmPerMin: 0.5, outerSpanMm: 40 }) // 9.375e-5
 */
export function threePointStrainRatePerS(bar: Driven & { readonly outerSpanMm: number }): number {
  const { depthMm, crossheadMmPerMin, outerSpanMm } = bar;
  requireFinite({ depthMm, crossheadMmPerMin, outerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requirePositive({ crossheadMmPerMin }, 'non-positive-rate');
  return (6 * depthMm * (crossheadMmPerMin / secondsPerMinute)) / outerSpanMm ** 2;
}

/**
 * Strain rate of the outer fibre between the inner rollers of a four-point bar, 1/s. Method `strainRate.crosshead4`.
 *
 * Holds for a rigid machine, small deflection and equal arms; a machine that gives makes it lower.
 * Source: beam theory with a = (Lo − Li)/2, 3ds/[a(3Lo − 4a)]: the crosshead goes with the inner rollers.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, non-positive-rate
 * @example fourPointStrainRatePerS({ depthMm: 1.5, crossheadMmPerMin: 0.2, outerSpanMm: 20, innerSpanMm: 10 }) // 7.5e-5
 */
export function fourPointStrainRatePerS(bar: Driven & FourPointSpans): number {
  const { depthMm, crossheadMmPerMin, outerSpanMm, innerSpanMm } = bar;
  requireFinite({ depthMm, crossheadMmPerMin, outerSpanMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  requirePositive({ crossheadMmPerMin }, 'non-positive-rate');
  const armMm = momentArmMm(bar);
  return (3 * depthMm * (crossheadMmPerMin / secondsPerMinute)) / (armMm * (3 * outerSpanMm - 4 * armMm));
}
