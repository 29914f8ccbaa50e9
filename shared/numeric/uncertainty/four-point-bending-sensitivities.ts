import { fourPointBendingStressMPa, type FourPointBar } from '../bending/four-point-bending-stress.ts';

/**
 * Change of the nominal four-point stress per unit of each input, MPa/N for the load and MPa/mm else.
 * Source: derivatives of 3F(Lo − Li)/(2bd²). Refuses as `bend4.rect`.
 */
export function fourPointBendingSensitivities(bar: FourPointBar) {
  const { outerSpanMm, innerSpanMm, widthMm, depthMm } = bar;
  const stressMPa = fourPointBendingStressMPa(bar);
  const perSpan = stressMPa / (outerSpanMm - innerSpanMm);
  return {
    // per newton at any load, so that a zero load has a sensitivity too
    load: fourPointBendingStressMPa({ ...bar, loadN: 1 }),
    outerSpan: perSpan,
    innerSpan: -perSpan,
    width: -stressMPa / widthMm,
    depth: (-2 * stressMPa) / depthMm,
  };
}
