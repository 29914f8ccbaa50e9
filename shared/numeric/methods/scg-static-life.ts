import { staticLifeS } from '../slow-growth/static-life.ts';
import { numberGiven } from './given.ts';
import { growthInputs } from './growth-inputs.ts';
import type { Method } from './method.ts';

export const scgStaticLife: Method = {
  id: 'scg.staticLife',
  version: 1,
  line: 'supporting',
  title: 'Time to fracture under a constant stress',
  inputs: [
    growthInputs.inertStrength,
    growthInputs.growthConstant,
    growthInputs.exponent,
    { ...growthInputs.stress, label: 'Constant stress', limits: 'more than 0 and less than the inert strength' },
  ],
  outputs: [{ name: 'life', label: 'Time to fracture', symbol: 't', unit: 's' }],
  mainOutput: 'life',
  formula: {
    symbols: 'B·Si^(n−2) / σⁿ',
    template: () => '{B} × ({inertStrength})^({n} − 2) / ({stress})^{n}',
  },
  source: { text: 'Power law integrated at a constant stress, well below the inert strength', tag: 're-derived' },
  run: (given) => ({
    life: staticLifeS({
      inertStrengthMPa: numberGiven(given, 'inertStrength'),
      growthConstantMPa2S: numberGiven(given, 'B'),
      exponent: numberGiven(given, 'n'),
      stressMPa: numberGiven(given, 'stress'),
    }),
  }),
  cautions: () => [],
};
