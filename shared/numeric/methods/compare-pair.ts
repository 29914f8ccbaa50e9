import { judgePair } from '../comparison/judge-pair.ts';
import { pairInputs } from './compare-inputs.ts';
import { numberGiven, optionalNumberGiven } from './given.ts';
import type { Caution, GivenInputs, Method, MethodOutput, Outputs } from './method.ts';

export const pairOutputs: readonly MethodOutput[] = [
  { name: 'zeta', label: 'Difference in standard uncertainties', symbol: 'ζ', unit: '1' },
  { name: 'En', label: 'Difference against U (k = 2)', symbol: 'En', unit: '1' },
  { name: 'verdict', label: 'Verdict', symbol: '', unit: null },
];

const judged = (given: GivenInputs) =>
  judgePair({
    stress1MPa: numberGiven(given, 'stress1'),
    u1MPa: numberGiven(given, 'u1'),
    stress2MPa: numberGiven(given, 'stress2'),
    u2MPa: numberGiven(given, 'u2'),
    covarianceMPa2: 'covariance' in given ? (optionalNumberGiven(given, 'covariance') ?? Number.NaN) : 0,
  });

/** The verdict on a pair, from the inputs of either comparison. */
export function comparedPair(given: GivenInputs): Outputs {
  const { zeta, en, verdict } = judged(given);
  return { zeta, En: en, verdict };
}

/** Says when agreeing says little. */
export function weaknessCautions(given: GivenInputs): Caution[] {
  if (!judged(given).weakly) return [];
  const sentence = 'They agree weakly: one side is uncertain by more than a quarter of its stress.';
  return [{ code: 'agrees-weakly', weight: 'note', sentence }];
}

export const comparePair: Method = {
  id: 'compare.pair',
  version: 1,
  line: 'supporting',
  title: 'Two stresses against each other',
  inputs: pairInputs,
  outputs: pairOutputs,
  formula: {
    symbols: '(σ₁ − σ₂) / √(u₁² + u₂²)',
    template: () => '({stress1} − {stress2}) / √(({u1})² + ({u2})²)',
  },
  source: { text: 'ζ and En after ISO 13528; agree to 2, doubtful to 3', tag: 'practice' },
  run: comparedPair,
  cautions: weaknessCautions,
};
