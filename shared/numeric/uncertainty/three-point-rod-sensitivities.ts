import { threePointRodStressMPa, type ThreePointRod } from '../bending/three-point-rod-stress.ts';

/**
 * Change of the nominal stress of a three-point rod per unit of each input, MPa/N for the load and MPa/mm else.
 * Source: derivatives of 8FL/(πD³). Refuses as `bend3.rod`.
 */
export function threePointRodSensitivities(rod: ThreePointRod) {
  const stressMPa = threePointRodStressMPa(rod);
  return {
    load: threePointRodStressMPa({ ...rod, loadN: 1 }),
    outerSpan: stressMPa / rod.outerSpanMm,
    diameter: (-3 * stressMPa) / rod.diameterMm,
  };
}
