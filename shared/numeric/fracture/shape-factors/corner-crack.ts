import { requireFinite, requirePositive, requireThat } from '../../require.ts';
import type { CrackRatios, LoadMode } from './crack-front.ts';

export type CornerCrack = {
  /** Along the depth of the section, mm, > 0, less than the thickness. */
  readonly flawDepthMm: number;
  /** Along the width of the section, mm, > 0. */
  readonly flawLengthMm: number;
  /** Section along the depth, mm, > 0. */
  readonly thicknessMm: number;
  /** Full section along the width, mm, > 0; left out for a wide section. */
  readonly widthMm?: number | undefined;
  readonly mode: LoadMode;
};

/**
 * The ratios of a corner crack within the range of Newman and Raju's equations.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-flaw-size,
 * flaw-deeper-than-section, outside-validity-range
 */
export function cornerCrackRatios(crack: Omit<CornerCrack, 'mode'>): CrackRatios {
  const { flawDepthMm, flawLengthMm, thicknessMm, widthMm } = crack;
  const given: Record<string, number> = widthMm === undefined ? {} : { widthMm };
  requireFinite({ flawDepthMm, flawLengthMm, thicknessMm, ...given });
  requirePositive({ thicknessMm, ...given }, 'non-positive-dimension');
  requirePositive({ flawDepthMm, flawLengthMm }, 'non-positive-flaw-size');
  requireThat(flawDepthMm < thicknessMm, 'flaw-deeper-than-section', 'flawDepthMm');
  const depthOverHalfLength = flawDepthMm / flawLengthMm;
  const halfLengthOverWidth = widthMm === undefined ? 0 : flawLengthMm / widthMm;
  requireThat(halfLengthOverWidth < 0.5, 'outside-validity-range', 'flawLengthMm');
  // the report states the corner form from 0.2 up only, unlike that of the surface crack
  requireThat(depthOverHalfLength >= 0.2 && depthOverHalfLength <= 2, 'outside-validity-range', 'flawDepthMm');
  return { depthOverHalfLength, depthOverThickness: flawDepthMm / thicknessMm, halfLengthOverWidth };
}
