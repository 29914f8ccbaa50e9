import type { FourPointBar } from '../bending/four-point-bending-stress.ts';
import { fourPointLocalStress } from '../bending/four-point-local-stress.ts';
import type { OriginInBar } from '../bending/local-stress.ts';

/**
 * Change of the four-point stress at an origin per unit of each input, MPa/N for the load and MPa/mm else.
 *
 * Between the inner rollers (and on them) the position x does not count; between an inner and an outer roller the inner
 * span does not count. The slope changes at the inner roller, so the method adds a caution near it.
 * Source: derivatives of sigma_nominal · m(x) · (1 − 2y/d). Refuses as `bend4.rect.local`.
 */
export function fourPointLocalSensitivities(bar: FourPointBar & OriginInBar) {
  const { widthMm, depthMm, yMm } = bar;
  const { nominalStressMPa, momentRatio, localStressMPa } = fourPointLocalStress(bar);
  return {
    load: fourPointLocalStress({ ...bar, loadN: 1 }).localStressMPa,
    ...alongTheBar(bar),
    width: -localStressMPa / widthMm,
    depth: (-2 * localStressMPa) / depthMm + (nominalStressMPa * momentRatio * 2 * yMm) / depthMm ** 2,
    y: (-2 * nominalStressMPa * momentRatio) / depthMm,
  };
}

/** Outer span, inner span and x. Written with the stress per mm of arm, which stays finite at the outer roller. */
function alongTheBar(bar: FourPointBar & OriginInBar) {
  const { nominalStressMPa, depthRatio } = fourPointLocalStress(bar);
  const perMm = (nominalStressMPa * depthRatio) / (bar.outerSpanMm - bar.innerSpanMm);
  if (Math.abs(bar.xMm) <= bar.innerSpanMm / 2) return { outerSpan: perMm, innerSpan: -perMm, x: 0 };
  return { outerSpan: perMm, innerSpan: 0, x: -Math.sign(bar.xMm) * 2 * perMm };
}
