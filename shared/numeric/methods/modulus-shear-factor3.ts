import { shearDeflectionFactor } from '../bending/shear-deflection-factor.ts';
import { checkInputs } from './check-inputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  poissonRatio: numberGiven(given, 'poisson'),
});

export const modulusShearFactor3: Method = {
  id: 'modulus.shearFactor3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: part of shear in the deflection',
  inputs: [checkInputs.depth, checkInputs.outerSpan, checkInputs.poisson],
  outputs: [{ name: 'deflectionFactor', label: 'Deflection with shear over that without', symbol: 'f', unit: '1' }],
  mainOutput: 'deflectionFactor',
  formula: { symbols: '1 + 2.4(1 + ν)(d/L)²', template: () => '1 + 2.4 × (1 + {poisson}) × ({depth} / {outerSpan})²' },
  source: { text: 'Timoshenko beam with κ = 5/6', tag: 're-derived' },
  run: (given) => ({ deflectionFactor: shearDeflectionFactor(bar(given)) }),
  cautions: () => [],
};
