import { fourPointRodStressMPa, type FourPointRod } from '../bending/four-point-rod-stress.ts';

/**
 * Change of the nominal stress of a four-point rod per unit of each input, MPa/N for the load and MPa/mm else.
 * Source: derivatives of 8F(Lo − Li)/(πD³). Refuses as `bend4.rod`.
 */
export function fourPointRodSensitivities(rod: FourPointRod) {
  const stressMPa = fourPointRodStressMPa(rod);
  const perSpan = stressMPa / (rod.outerSpanMm - rod.innerSpanMm);
  return {
    load: fourPointRodStressMPa({ ...rod, loadN: 1 }),
    outerSpan: perSpan,
    innerSpan: -perSpan,
    diameter: (-3 * stressMPa) / rod.diameterMm,
  };
}
