import { threePointFrictionError } from '../bending/three-point-friction-error.ts';
import { frictionCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  frictionCoefficient: numberGiven(given, 'frictionCoefficient'),
  depthMm: numberGiven(given, 'depth'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
});

export const errorFriction3: Method = {
  id: 'error.friction3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: bearings that cannot roll',
  inputs: [checkInputs.frictionCoefficient, checkInputs.depth, checkInputs.outerSpan],
  outputs: [checkOutputs.relativeStressError],
  mainOutput: 'relativeStressError',
  formula: { symbols: '−4μd/3L', template: () => '−4 × {frictionCoefficient} × {depth} / (3 × {outerSpan})' },
  source: { text: 'Statics, full sliding', tag: 're-derived' },
  run: (given) => ({ relativeStressError: threePointFrictionError(bar(given)) }),
  cautions: frictionCautions,
};
