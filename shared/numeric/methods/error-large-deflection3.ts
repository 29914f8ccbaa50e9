import { largeDeflectionFactor } from '../bending/large-deflection-factor.ts';
import { deflectionCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  deflectionMm: numberGiven(given, 'deflection'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
});

export const errorLargeDeflection3: Method = {
  id: 'error.largeDeflection3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: large deflection',
  inputs: [checkInputs.deflection, checkInputs.outerSpan],
  outputs: [{ name: 'momentFactor', label: 'True moment over FL/4', symbol: 'f', unit: '1' }],
  mainOutput: 'momentFactor',
  formula: { symbols: '1 + 6(δ/L)²', template: () => '1 + 6 × ({deflection} / {outerSpan})²' },
  source: { text: 'Reaction at right angles to the beam; elastica integrated as a check', tag: 're-derived' },
  run: (given) => ({ momentFactor: largeDeflectionFactor(bar(given)) }),
  cautions: (given) => deflectionCautions(given, 'outerSpan'),
};
