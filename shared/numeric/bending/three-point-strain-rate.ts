import { requireFinite, requirePositive } from '../require.ts';

export type DrivenBar = {
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
  /** Of the crosshead, mm/min, > 0. */
  readonly crossheadMmPerMin: number;
};

export const secondsPerMinute = 60;

/**
 * Strain rate of the outer fibre at mid-span of a three-point bar, 1/s. Method `strainRate.crosshead3`.
 *
 * Holds for a rigid machine and small deflection; a machine that gives makes it lower.
 * Source: beam theory, 6ds/L².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * non-positive-rate
 * @example threePointStrainRatePerS({ depthMm: 3, crossheadMmPerMin: 0.5, outerSpanMm: 40 }) // 9.375e-5
 */
export function threePointStrainRatePerS(bar: DrivenBar & { readonly outerSpanMm: number }): number {
  const { depthMm, crossheadMmPerMin, outerSpanMm } = bar;
  requireFinite({ depthMm, crossheadMmPerMin, outerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requirePositive({ crossheadMmPerMin }, 'non-positive-rate');
  return (6 * depthMm * (crossheadMmPerMin / secondsPerMinute)) / outerSpanMm ** 2;
}
