import type { DiscStress } from '../bending/disc-stress.ts';
import type { MethodOutput, Outputs } from './method.ts';

/** What the methods for a place on a disc give; the last is the larger. */
export const discStressOutputs: readonly MethodOutput[] = [
  { name: 'radialStress', label: 'Stress along the radius', symbol: 'σᵣ', unit: 'MPa' },
  { name: 'tangentialStress', label: 'Stress across the radius', symbol: 'σθ', unit: 'MPa' },
];

/** The stresses on a disc under the names of the outputs. */
export function discStressToOutputs(stress: DiscStress): Outputs {
  return { radialStress: stress.radialStressMPa, tangentialStress: stress.tangentialStressMPa };
}
