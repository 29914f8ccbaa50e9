import type { LocalStress } from '../bending/local-stress.ts';
import type { MethodOutput, Outputs } from './method.ts';

/** What the local bending methods give; the last is the one that carries the uncertainty. */
export const localStressOutputs: readonly MethodOutput[] = [
  { name: 'nominalStress', label: 'Nominal stress on the tensile face', symbol: 'σ₀', unit: 'MPa' },
  { name: 'momentRatio', label: 'Moment ratio at the origin', symbol: 'm', unit: '1' },
  { name: 'depthRatio', label: 'Depth ratio at the origin', symbol: 'k', unit: '1' },
  { name: 'localStress', label: 'Stress at the origin', symbol: 'σ', unit: 'MPa' },
];

/** The record of a local stress under the names of the outputs. */
export function localStressToOutputs(stress: LocalStress): Outputs {
  return {
    nominalStress: stress.nominalStressMPa,
    momentRatio: stress.momentRatio,
    depthRatio: stress.depthRatio,
    localStress: stress.localStressMPa,
  };
}
