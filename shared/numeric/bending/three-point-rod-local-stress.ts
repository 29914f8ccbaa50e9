import { requireFinite } from '../require.ts';
import type { LocalStress, OriginInBar } from './local-stress.ts';
import { requireOriginInBar } from './require-origin-in-bar.ts';
import { threePointRodStressMPa, type ThreePointRod } from './three-point-rod-stress.ts';

/**
 * Axial stress at an origin in a three-point rod, MPa; negative is compression and is given, not refused. y is counted in
 * the plane of bending from the lowest fibre. Method `bend3.rod.local`.
 *
 * Holds as `bend3.rod`; contact stress within about one diameter of a roller is left out. Rounding only.
 * Source: sigma = M(x) (D/2 − y) / I = sigma_nominal (1 − 2|x|/L) (1 − 2y/D).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span, negative-load,
 * depth-outside-section, position-outside-span
 * @example threePointRodLocalStress({ loadN: 454, outerSpanMm: 100, diameterMm: 10, xMm: 8, yMm: 0 }).localStressMPa // 97.11…
 */
export function threePointRodLocalStress(rod: ThreePointRod & OriginInBar): LocalStress {
  requireFinite({ ...rod });
  const nominalStressMPa = threePointRodStressMPa(rod);
  requireOriginInBar({ ...rod, depthMm: rod.diameterMm });
  const momentRatio = 1 - (2 * Math.abs(rod.xMm)) / rod.outerSpanMm;
  const depthRatio = 1 - (2 * rod.yMm) / rod.diameterMm;
  return { nominalStressMPa, momentRatio, depthRatio, localStressMPa: nominalStressMPa * momentRatio * depthRatio };
}
