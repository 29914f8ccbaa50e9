import type { FourPointBar } from '../bending/four-point-bending-stress.ts';
import { fourPointLocalStress } from '../bending/four-point-local-stress.ts';
import type { OriginInBar } from '../bending/local-stress.ts';
import { alongFourPointBar } from './along-four-point-bar.ts';

/**
 * Change of the four-point stress at an origin per unit of each input, MPa/N for the load and MPa/mm else.
 *
 * Between the inner rollers (and on them) the position x does not count; between an inner and an outer roller the inner
 * span does not count. The slope changes at the inner roller, so the method adds a caution near it.
 * Source: derivatives of sigma_nominal · m(x) · (1 − 2y/d). Refuses as `bend4.rect.local`.
 */
export function fourPointLocalSensitivities(bar: FourPointBar & OriginInBar) {
  const { widthMm, depthMm, yMm } = bar;
  const { nominalStressMPa, momentRatio, depthRatio, localStressMPa } = fourPointLocalStress(bar);
  return {
    load: fourPointLocalStress({ ...bar, loadN: 1 }).localStressMPa,
    ...alongFourPointBar({ ...bar, stressAtDepthMPa: nominalStressMPa * depthRatio }),
    width: -localStressMPa / widthMm,
    depth: (-2 * localStressMPa) / depthMm + (nominalStressMPa * momentRatio * 2 * yMm) / depthMm ** 2,
    y: (-2 * nominalStressMPa * momentRatio) / depthMm,
  };
}
