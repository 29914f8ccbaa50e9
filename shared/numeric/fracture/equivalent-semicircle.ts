import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { summariseFront } from './shape-factors/front-summary.ts';
import { surfaceCrackAt } from './shape-factors/surface-crack-at.ts';

export type SurfaceFlaw = {
  /** Depth of the flaw, mm, > 0. */
  readonly flawDepthMm: number;
  /** Half of its length on the surface, mm, > 0. */
  readonly flawHalfLengthMm: number;
};

/**
 * Radius of the half-circle that stands for a half-elliptical surface flaw, mm, in two ways: of the same area, and of the
 * same largest stress intensity. Method `flaw.equivalentSemicircle`. Say which is reported.
 *
 * The second holds for a flaw small against the section, in tension. Accurate as the shape factor, ±5 %.
 * Source: √(a c); a (Ymax / Ymax of the half-circle)², Newman and Raju.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-flaw-size, outside-validity-range (a/c > 2)
 * @example equivalentSemicircle({ flawDepthMm: 0.04, flawHalfLengthMm: 0.1 }) // { byAreaMm: 0.06324…, byIntensityMm: 0.06813… }
 */
export function equivalentSemicircle(flaw: SurfaceFlaw): { readonly byAreaMm: number; readonly byIntensityMm: number } {
  const { flawDepthMm, flawHalfLengthMm } = flaw;
  requireFinite({ flawDepthMm, flawHalfLengthMm });
  requirePositive({ flawDepthMm, flawHalfLengthMm }, 'non-positive-flaw-size');
  const shape = flawDepthMm / flawHalfLengthMm;
  requireThat(shape <= 2, 'outside-validity-range', 'flawDepthMm');
  return {
    byAreaMm: Math.sqrt(flawDepthMm * flawHalfLengthMm),
    byIntensityMm: flawDepthMm * (smallFlawFactor(shape) / smallFlawFactor(1)) ** 2,
  };
}

/** Largest shape factor in tension of a flaw small against the section. */
function smallFlawFactor(shape: number): number {
  const ratios = { depthOverHalfLength: shape, depthOverThickness: 0, halfLengthOverWidth: 0 };
  return summariseFront((angleRad) => surfaceCrackAt(ratios, 'tension', angleRad).shapeFactor).largestFactor;
}
