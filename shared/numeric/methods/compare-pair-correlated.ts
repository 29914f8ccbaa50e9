import { pairInputs } from './compare-inputs.ts';
import { comparedPair, pairOutputs, weaknessCautions } from './compare-pair.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const comparePairCorrelated: Method = {
  id: 'compare.pair.correlated',
  version: 1,
  line: 'supporting',
  title: 'Two stresses that share inputs',
  inputs: [
    ...pairInputs,
    {
      kind: 'number',
      name: 'covariance',
      label: 'Covariance from shared inputs',
      symbol: 'cov',
      unit: 'MPa²',
      unitKind: 'stressSquared',
      argument: 'covarianceMPa2',
      limits: 'less than half of u₁² + u₂²',
      openUnit: false,
      uncertainty: 'none',
    },
  ],
  outputs: pairOutputs,
  formula: {
    symbols: '(σ₁ − σ₂) / √(u₁² + u₂² − 2 cov)',
    template: () => '({stress1} − {stress2}) / √(({u1})² + ({u2})² − 2 × {covariance})',
  },
  source: { text: 'Variance of a difference with shared inputs', tag: 're-derived' },
  run: (given) => comparedPair({ ...given, covariance: { value: numberGiven(given, 'covariance') } }),
  cautions: weaknessCautions,
};
