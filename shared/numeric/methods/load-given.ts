import { givenStressMPa } from '../bending/given-stress.ts';
import { numberGiven, uncertaintyGiven } from './given.ts';
import type { Method } from './method.ts';

export const loadGiven: Method = {
  id: 'load.given',
  version: 1,
  line: 'load',
  title: 'Stress at the origin, given by an analysis',
  inputs: [
    {
      kind: 'number',
      name: 'stress',
      label: 'Stress at the origin',
      symbol: 'σ',
      unit: 'MPa',
      unitKind: 'stress',
      argument: 'stressMPa',
      limits: 'more than 0, with its uncertainty; from the analysis that is attached or named',
      openUnit: true,
      uncertainty: 'expected',
    },
  ],
  outputs: [{ name: 'stress', label: 'Stress at the origin', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: { symbols: 'σ', template: () => '{stress}' },
  source: { text: 'The analysis itself; nothing is reckoned here', tag: 'practice' },
  run: (given) => ({
    stress: givenStressMPa({
      stressMPa: numberGiven(given, 'stress'),
      standardUncertaintyMPa: uncertaintyGiven(given, 'stress'),
    }),
  }),
  sensitivities: () => ({ stress: 1 }),
  cautions: () => [],
};
