import { meanMomentRatio } from '../bending/mean-moment-ratio.ts';
import { checkInputs } from './check-inputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const gauge = (given: GivenInputs) => ({
  outerSpanMm: numberGiven(given, 'outerSpan'),
  gaugeLengthMm: numberGiven(given, 'gaugeLength'),
  offsetMm: numberGiven(given, 'offset'),
});

export const gaugeMeanMomentRatio3: Method = {
  id: 'gauge.meanMomentRatio3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: mean moment along a strain gauge',
  inputs: [checkInputs.outerSpan, checkInputs.gaugeLength, checkInputs.offset],
  outputs: [{ name: 'meanMomentRatio', label: 'Mean moment over that at mid-span', symbol: 'm', unit: '1' }],
  mainOutput: 'meanMomentRatio',
  formula: {
    symbols: 'mean of 1 − 2|x|/L along the gauge',
    template: () => 'mean of 1 − 2|x| / {outerSpan} over {gaugeLength} about {offset}',
  },
  source: { text: 'Beam theory', tag: 're-derived' },
  run: (given) => ({ meanMomentRatio: meanMomentRatio(gauge(given)) }),
  cautions: () => [],
};
