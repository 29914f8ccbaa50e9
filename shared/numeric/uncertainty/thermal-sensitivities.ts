import { plateCooledStress, type CooledPlate } from '../thermal/plate-cooled-stress.ts';
import { plateInstantStressMPa, type QuenchedPlate } from '../thermal/plate-instant-stress.ts';

/**
 * Change of the stress of instant cooling per unit of modulus (MPa/GPa), expansion (MPa·K), temperature drop (MPa/K) and
 * Poisson's ratio (MPa). Source: derivatives of E α ΔT / (1 − ν). Refuses as `thermal.plateInstant`.
 */
export function plateInstantSensitivities(plate: QuenchedPlate) {
  const stressMPa = plateInstantStressMPa(plate);
  return {
    E: stressMPa / plate.modulusGPa,
    alpha: plateInstantStressMPa({ ...plate, expansionPerK: 1 }),
    deltaT: plateInstantStressMPa({ ...plate, temperatureDropK: 1 }),
    poisson: stressMPa / (1 - plate.poissonRatio),
  };
}

/**
 * The same for a plate cooled by a fluid, and per unit of heat transfer, half thickness (MPa/mm) and conductivity.
 * Source: ψ times the above, and ∂ln ψ/∂ln Bi = (3.25/Bi + (8/Bi) exp(−16/Bi)) ψ, 1 at small Bi and 0 at large.
 * Refuses as `thermal.plateBiot`.
 */
export function plateCooledSensitivities(plate: CooledPlate) {
  const { biotNumber, peakFactor, stressMPa } = plateCooledStress(plate);
  const instant = plateInstantSensitivities(plate);
  const perLogBiot = stressMPa * peakFactor * ((3.25 + 8 * Math.exp(-16 / biotNumber)) / biotNumber);
  return {
    E: peakFactor * instant.E,
    alpha: peakFactor * instant.alpha,
    deltaT: peakFactor * instant.deltaT,
    poisson: peakFactor * instant.poisson,
    h: perLogBiot / plate.heatTransferWPerM2K,
    halfThickness: perLogBiot / plate.halfThicknessMm,
    conductivity: -perLogBiot / plate.conductivityWPerMK,
  };
}
