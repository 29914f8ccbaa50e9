import { requireFinite } from '../require.ts';
import { fourPointMomentRatio } from './four-point-moment-ratio.ts';
import { fourPointRodStressMPa, type FourPointRod } from './four-point-rod-stress.ts';
import type { LocalStress, OriginInBar } from './local-stress.ts';
import { requireOriginInBar } from './require-origin-in-bar.ts';

/**
 * Axial stress at an origin in a four-point rod, MPa; negative is compression and is given, not refused. y is counted in
 * the plane of bending from the lowest fibre. Method `bend4.rod.local`.
 *
 * Holds as `bend4.rod`; contact stress within about one diameter of a roller is left out. Rounding only.
 * Source: sigma = M(x) (D/2 − y) / I; the moment is level between the inner rollers and falls in a line to the outer ones.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, negative-load, depth-outside-section, position-outside-span
 * @example fourPointRodLocalStress({ loadN: 690, outerSpanMm: 40, innerSpanMm: 20, diameterMm: 4, xMm: -11.5, yMm: 0.25 }).localStressMPa // 408.38…
 */
export function fourPointRodLocalStress(rod: FourPointRod & OriginInBar): LocalStress {
  requireFinite({ ...rod });
  const nominalStressMPa = fourPointRodStressMPa(rod);
  requireOriginInBar({ ...rod, depthMm: rod.diameterMm });
  const momentRatio = fourPointMomentRatio(rod);
  const depthRatio = 1 - (2 * rod.yMm) / rod.diameterMm;
  return { nominalStressMPa, momentRatio, depthRatio, localStressMPa: nominalStressMPa * momentRatio * depthRatio };
}
