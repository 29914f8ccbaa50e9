import {
  fourPointRodAngleStress,
  radiansPerDegree,
  type OriginRoundRod,
} from '../bending/four-point-rod-angle-stress.ts';
import type { FourPointRod } from '../bending/four-point-rod-stress.ts';
import { alongFourPointBar } from './along-four-point-bar.ts';

/**
 * Change of the stress at a surface origin of a four-point rod per unit of each input: MPa/N for the load, MPa per degree
 * for the angle and MPa/mm else. The diameter counts three times, since the angle stays.
 * Source: derivatives of sigma_nominal · m(x) · cos θ. Refuses as `bend4.rod.local.angle`.
 */
export function fourPointRodAngleSensitivities(rod: FourPointRod & OriginRoundRod) {
  const { nominalStressMPa, momentRatio, depthRatio, localStressMPa } = fourPointRodAngleStress(rod);
  return {
    load: fourPointRodAngleStress({ ...rod, loadN: 1 }).localStressMPa,
    ...alongFourPointBar({ ...rod, stressAtDepthMPa: nominalStressMPa * depthRatio }),
    diameter: (-3 * localStressMPa) / rod.diameterMm,
    angle: -nominalStressMPa * momentRatio * Math.sin(rod.angleDeg * radiansPerDegree) * radiansPerDegree,
  };
}
