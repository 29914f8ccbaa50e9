import { fourPointStrainRatePerS } from '../bending/four-point-strain-rate.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  crossheadMmPerMin: numberGiven(given, 'crossheadRate'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
});

export const strainRateCrosshead4: Method = {
  id: 'strainRate.crosshead4',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: strain rate from the crosshead',
  inputs: [checkInputs.depth, checkInputs.crossheadRate, checkInputs.outerSpan, checkInputs.innerSpan],
  outputs: [checkOutputs.strainRate],
  mainOutput: 'strainRate',
  formula: {
    symbols: '3ds / [a(3L − 4a)], a = (L − l)/2',
    template: () =>
      '3 × {depth} × {crossheadRate} / [a × (3 × {outerSpan} − 4a)], a = ({outerSpan#} − {innerSpan#}) mm / 2',
  },
  source: { text: 'Beam theory, rigid machine', tag: 're-derived' },
  run: (given) => ({ strainRate: fourPointStrainRatePerS(bar(given)) }),
  cautions: () => [],
};
