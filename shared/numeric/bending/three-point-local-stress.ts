import { requireFinite } from '../require.ts';
import type { LocalStress, OriginInBar } from './local-stress.ts';
import { requireOriginInBar } from './require-origin-in-bar.ts';
import { threePointBendingStressMPa, type ThreePointBar } from './three-point-bending-stress.ts';

/**
 * Axial stress at an origin in a three-point bar, MPa; negative is compression and is given, not refused.
 * Method `bend3.rect.local`.
 *
 * Holds as `bend3.rect`; contact stress within about one depth of a roller is left out. Rounding only.
 * Source: sigma = M(x) (d/2 − y) / I = sigma_nominal (1 − 2|x|/L) (1 − 2y/d).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span, negative-load,
 * depth-outside-section, position-outside-span
 * @example threePointLocalStress({ loadN: 612.5, outerSpanMm: 40, widthMm: 4, depthMm: 3, xMm: -3.2, yMm: 0.15 }).localStressMPa // 771.75
 */
export function threePointLocalStress(bar: ThreePointBar & OriginInBar): LocalStress {
  requireFinite({ ...bar });
  const nominalStressMPa = threePointBendingStressMPa(bar);
  requireOriginInBar(bar);
  const momentRatio = 1 - (2 * Math.abs(bar.xMm)) / bar.outerSpanMm;
  const depthRatio = 1 - (2 * bar.yMm) / bar.depthMm;
  return { nominalStressMPa, momentRatio, depthRatio, localStressMPa: nominalStressMPa * momentRatio * depthRatio };
}
