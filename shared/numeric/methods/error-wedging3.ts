import { threePointWedgingError } from '../bending/three-point-wedging-error.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
});

export const errorWedging3: Method = {
  id: 'error.wedging3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: wedging opposite the roller',
  inputs: [checkInputs.depth, checkInputs.outerSpan],
  outputs: [checkOutputs.relativeStressError],
  mainOutput: 'relativeStressError',
  formula: { symbols: '−0.1743 d/L', template: () => '−0.1743 × {depth} / {outerSpan}' },
  source: { text: 'Exact elastic strip under a point load', tag: 're-derived' },
  run: (given) => ({ relativeStressError: threePointWedgingError(bar(given)) }),
  cautions: () => [],
};
