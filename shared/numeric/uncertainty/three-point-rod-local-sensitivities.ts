import type { OriginInBar } from '../bending/local-stress.ts';
import { threePointRodLocalStress } from '../bending/three-point-rod-local-stress.ts';
import type { ThreePointRod } from '../bending/three-point-rod-stress.ts';

/**
 * Change of the stress at an origin in a three-point rod per unit of each input, MPa/N for the load and MPa/mm else.
 *
 * At x = 0 the stress has a kink in x; the slope to the right of it is given, as for a bar.
 * Source: derivatives of 8F(L − 2|x|)/(πD³) · (1 − 2y/D). Refuses as `bend3.rod.local`.
 */
export function threePointRodLocalSensitivities(rod: ThreePointRod & OriginInBar) {
  const { outerSpanMm, diameterMm, xMm, yMm } = rod;
  const { nominalStressMPa, momentRatio, depthRatio, localStressMPa } = threePointRodLocalStress(rod);
  const side = xMm < 0 ? -1 : 1;
  return {
    load: threePointRodLocalStress({ ...rod, loadN: 1 }).localStressMPa,
    outerSpan: (nominalStressMPa * depthRatio) / outerSpanMm,
    diameter: (-3 * localStressMPa) / diameterMm + (nominalStressMPa * momentRatio * 2 * yMm) / diameterMm ** 2,
    x: (-side * 2 * nominalStressMPa * depthRatio) / outerSpanMm,
    y: (-2 * nominalStressMPa * momentRatio) / diameterMm,
  };
}
