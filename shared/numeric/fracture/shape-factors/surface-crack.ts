import { requireFinite, requirePositive, requireThat } from '../../require.ts';
import type { CrackRatios, LoadMode } from './crack-front.ts';

export type SurfaceCrack = {
  /** Depth of the crack, mm, > 0, less than the thickness. */
  readonly flawDepthMm: number;
  /** Half of its length on the surface, mm, > 0. */
  readonly flawHalfLengthMm: number;
  /** Section along the depth, mm, > 0. */
  readonly thicknessMm: number;
  /** Half of the section along the surface, mm, > 0; left out for a wide section. */
  readonly halfWidthMm?: number | undefined;
  readonly mode: LoadMode;
};

/**
 * The ratios of a surface crack within the range of Newman and Raju's equations.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-flaw-size,
 * flaw-deeper-than-section, outside-validity-range
 */
export function surfaceCrackRatios(crack: Omit<SurfaceCrack, 'mode'>): CrackRatios {
  const { flawDepthMm, flawHalfLengthMm, thicknessMm, halfWidthMm } = crack;
  const given: Record<string, number> = halfWidthMm === undefined ? {} : { halfWidthMm };
  requireFinite({ flawDepthMm, flawHalfLengthMm, thicknessMm, ...given });
  requirePositive({ thicknessMm, ...given }, 'non-positive-dimension');
  requirePositive({ flawDepthMm, flawHalfLengthMm }, 'non-positive-flaw-size');
  requireThat(flawDepthMm < thicknessMm, 'flaw-deeper-than-section', 'flawDepthMm');
  const depthOverHalfLength = flawDepthMm / flawHalfLengthMm;
  const depthOverThickness = flawDepthMm / thicknessMm;
  const halfLengthOverWidth = halfWidthMm === undefined ? 0 : flawHalfLengthMm / halfWidthMm;
  requireThat(halfLengthOverWidth < 0.5, 'outside-validity-range', 'flawHalfLengthMm');
  requireSurfaceShape(depthOverHalfLength, depthOverThickness);
  return { depthOverHalfLength, depthOverThickness, halfLengthOverWidth };
}

function requireSurfaceShape(shape: number, depth: number): void {
  requireThat(shape <= 2, 'outside-validity-range', 'flawDepthMm');
  requireThat(shape >= 0.2 || depth < 1.25 * (shape + 0.6), 'outside-validity-range', 'flawDepthMm');
}
