import type { OriginInBar } from '../bending/local-stress.ts';
import type { ThreePointBar } from '../bending/three-point-bending-stress.ts';
import { threePointLocalStress } from '../bending/three-point-local-stress.ts';

/**
 * Change of the three-point stress at an origin per unit of each input, MPa/N for the load and MPa/mm else.
 *
 * At x = 0 the stress has a kink in x; the slope to the right of it is given, which overstates a symmetric spread and
 * misses a small bias, so the method adds a caution while |x| < 2u(x).
 * Source: derivatives of 3F(L − 2|x|)/(2bd²) · (1 − 2y/d). Refuses as `bend3.rect.local`.
 */
export function threePointLocalSensitivities(bar: ThreePointBar & OriginInBar) {
  const { outerSpanMm, widthMm, depthMm, xMm, yMm } = bar;
  const { nominalStressMPa, momentRatio, depthRatio, localStressMPa } = threePointLocalStress(bar);
  const side = xMm < 0 ? -1 : 1;
  return {
    load: threePointLocalStress({ ...bar, loadN: 1 }).localStressMPa,
    outerSpan: (nominalStressMPa * depthRatio) / outerSpanMm,
    width: -localStressMPa / widthMm,
    depth: (-2 * localStressMPa) / depthMm + (nominalStressMPa * momentRatio * 2 * yMm) / depthMm ** 2,
    x: (-side * 2 * nominalStressMPa * depthRatio) / outerSpanMm,
    y: (-2 * nominalStressMPa * momentRatio) / depthMm,
  };
}
