import { supportedPlateStressMPa, type SupportedPlate } from '../bending/supported-plate-stress.ts';

/**
 * Change of the stress at the centre of a supported plate per unit of pressure (MPa/MPa), length (MPa/mm) and Poisson's
 * ratio (MPa).
 * Source: derivatives of 3(3 + ν)p(r/t)²/8. Refuses as `plate.supported.pressure`.
 */
export function supportedPlateSensitivities(plate: SupportedPlate) {
  const stressMPa = supportedPlateStressMPa(plate);
  return {
    pressure: supportedPlateStressMPa({ ...plate, pressureMPa: 1 }),
    radius: (2 * stressMPa) / plate.radiusMm,
    thickness: (-2 * stressMPa) / plate.thicknessMm,
    poisson: stressMPa / (3 + plate.poissonRatio),
  };
}
