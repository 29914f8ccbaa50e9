import { flawStressMPa, type CriticalFlaw } from '../fracture/flaw-stress.ts';

/**
 * Change of the flaw stress per unit of toughness (MPa per MPa√m), shape factor (MPa) and flaw size (MPa/mm).
 * Source: derivatives of K_Ic/(Y√c). Refuses as `flaw.stress`.
 */
export function flawSensitivities(flaw: CriticalFlaw) {
  const stressMPa = flawStressMPa(flaw);
  return {
    KIc: stressMPa / flaw.toughnessMPaRootM,
    Y: -stressMPa / flaw.shapeFactor,
    c: -stressMPa / (2 * flaw.flawSizeMm),
  };
}
