import { threePointStrainRatePerS } from '../bending/three-point-strain-rate.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  crossheadMmPerMin: numberGiven(given, 'crossheadRate'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
});

export const strainRateCrosshead3: Method = {
  id: 'strainRate.crosshead3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: strain rate from the crosshead',
  inputs: [checkInputs.depth, checkInputs.crossheadRate, checkInputs.outerSpan],
  outputs: [checkOutputs.strainRate],
  mainOutput: 'strainRate',
  formula: { symbols: '6ds / L²', template: () => '6 × {depth} × {crossheadRate} / ({outerSpan})²' },
  source: { text: 'Beam theory, rigid machine', tag: 're-derived' },
  run: (given) => ({ strainRate: threePointStrainRatePerS(bar(given)) }),
  cautions: () => [],
};
