import { fourPointWedgingError } from '../bending/four-point-wedging-error.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
});

export const errorWedging4: Method = {
  id: 'error.wedging4',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: wedging opposite an inner roller',
  inputs: [checkInputs.depth, checkInputs.outerSpan, checkInputs.innerSpan],
  outputs: [checkOutputs.relativeStressError],
  mainOutput: 'relativeStressError',
  formula: {
    symbols: '−0.0436 d/a, a = (L − l)/2',
    template: () => '−0.0436 × {depth} / [({outerSpan#} − {innerSpan#}) mm / 2]',
  },
  source: { text: 'Exact elastic strip under half the load', tag: 're-derived' },
  run: (given) => ({ relativeStressError: fourPointWedgingError(bar(given)) }),
  cautions: () => [],
};
