import { requireFinite } from '../require.ts';
import { fourPointBendingStressMPa, type FourPointBar } from './four-point-bending-stress.ts';
import { fourPointMomentRatio } from './four-point-moment-ratio.ts';
import type { LocalStress, OriginInBar } from './local-stress.ts';
import { requireOriginInBar } from './require-origin-in-bar.ts';

/**
 * Axial stress at an origin in a four-point bar, MPa; negative is compression and is given, not refused.
 * Method `bend4.rect.local`.
 *
 * Holds as `bend4.rect`; contact stress within about one depth of a roller is left out. Rounding only.
 * Source: sigma = M(x) (d/2 − y) / I; the moment is level between the inner rollers and falls in a line to the outer ones.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, negative-load, depth-outside-section, position-outside-span
 * @example fourPointLocalStress({ loadN: 500, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3, xMm: 13, yMm: 0.05 }).localStressMPa // 281.94…
 */
export function fourPointLocalStress(bar: FourPointBar & OriginInBar): LocalStress {
  requireFinite({ ...bar });
  const nominalStressMPa = fourPointBendingStressMPa(bar);
  requireOriginInBar(bar);
  const momentRatio = fourPointMomentRatio(bar);
  const depthRatio = 1 - (2 * bar.yMm) / bar.depthMm;
  return { nominalStressMPa, momentRatio, depthRatio, localStressMPa: nominalStressMPa * momentRatio * depthRatio };
}
