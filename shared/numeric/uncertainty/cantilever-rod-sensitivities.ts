import { cantileverRodStressMPa, type CantileverRod } from '../bending/cantilever-rod-stress.ts';

/**
 * Change of the stress at the fixed end per unit of each input, MPa/N for the load and MPa/mm else.
 * Source: derivatives of 32Fh/(πD³). Refuses as `cantilever.rod`.
 */
export function cantileverRodSensitivities(rod: CantileverRod) {
  const stressMPa = cantileverRodStressMPa(rod);
  return {
    load: cantileverRodStressMPa({ ...rod, loadN: 1 }),
    arm: stressMPa / rod.armMm,
    diameter: (-3 * stressMPa) / rod.diameterMm,
  };
}
