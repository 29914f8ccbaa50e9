import { threePointBendingStressMPa, type ThreePointBar } from '../bending/three-point-bending-stress.ts';

/**
 * Change of the nominal three-point stress per unit of each input, MPa/N for the load and MPa/mm else.
 * Source: derivatives of 3FL/(2bd²). Refuses as `bend3.rect`.
 */
export function threePointBendingSensitivities(bar: ThreePointBar) {
  const { outerSpanMm, widthMm, depthMm } = bar;
  const stressMPa = threePointBendingStressMPa(bar);
  return {
    // per newton at any load, so that a zero load has a sensitivity too
    load: threePointBendingStressMPa({ ...bar, loadN: 1 }),
    outerSpan: stressMPa / outerSpanMm,
    width: -stressMPa / widthMm,
    depth: (-2 * stressMPa) / depthMm,
  };
}
