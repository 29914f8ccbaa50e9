import { fourPointRodLocalStress } from '../bending/four-point-rod-local-stress.ts';
import type { FourPointRod } from '../bending/four-point-rod-stress.ts';
import type { OriginInBar } from '../bending/local-stress.ts';
import { alongFourPointBar } from './along-four-point-bar.ts';

/**
 * Change of the stress at an origin in a four-point rod per unit of each input, MPa/N for the load and MPa/mm else.
 *
 * Between the inner rollers the position does not count; outside them the inner span does not.
 * Source: derivatives of sigma_nominal · m(x) · (1 − 2y/D). Refuses as `bend4.rod.local`.
 */
export function fourPointRodLocalSensitivities(rod: FourPointRod & OriginInBar) {
  const { diameterMm, yMm } = rod;
  const { nominalStressMPa, momentRatio, depthRatio, localStressMPa } = fourPointRodLocalStress(rod);
  return {
    load: fourPointRodLocalStress({ ...rod, loadN: 1 }).localStressMPa,
    ...alongFourPointBar({ ...rod, stressAtDepthMPa: nominalStressMPa * depthRatio }),
    diameter: (-3 * localStressMPa) / diameterMm + (nominalStressMPa * momentRatio * 2 * yMm) / diameterMm ** 2,
    y: (-2 * nominalStressMPa * momentRatio) / diameterMm,
  };
}
