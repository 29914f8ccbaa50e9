import { requireFinite, requirePositive } from '../require.ts';
import { mpaPerGpa } from './gauge-modulus.ts';
import { slopeWithoutMachine, type ModulusFromSlope, type SlopedBar } from './slope-without-machine.ts';

/**
 * Elastic modulus of a three-point bar from the slope of load over mid-span deflection, GPa. Method `modulus.slope3`.
 *
 * Holds for small deflection of a slender elastic bar; shear is left out. Crosshead travel is no deflection unless the
 * compliance of the machine is taken off.
 * Source: beam theory, E = kL³/(4bd³), 1/k = 1/k_measured − C_machine.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * outside-validity-range for slope and compliance
 * @example threePointModulus({ slopeNPerMm: 2100, machineMmPerN: 0, outerSpanMm: 40, widthMm: 4, depthMm: 3 }).modulusGPa // 311.11…
 */
export function threePointModulus(bar: SlopedBar & { readonly outerSpanMm: number }): ModulusFromSlope {
  requireFinite({ ...bar });
  const { outerSpanMm, widthMm, depthMm } = bar;
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  const specimenSlopeNPerMm = slopeWithoutMachine(bar);
  const modulusMPa = (specimenSlopeNPerMm * outerSpanMm ** 3) / (4 * widthMm * depthMm ** 3);
  return { specimenSlopeNPerMm, modulusGPa: modulusMPa / mpaPerGpa };
}
