import { fourPointFrictionError } from '../bending/four-point-friction-error.ts';
import { frictionCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  frictionCoefficient: numberGiven(given, 'frictionCoefficient'),
  depthMm: numberGiven(given, 'depth'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
});

export const errorFriction4: Method = {
  id: 'error.friction4',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: bearings that cannot roll',
  inputs: [checkInputs.frictionCoefficient, checkInputs.depth, checkInputs.outerSpan, checkInputs.innerSpan],
  outputs: [checkOutputs.relativeStressError],
  mainOutput: 'relativeStressError',
  formula: {
    symbols: '−μd/a, a = (L − l)/2',
    template: () => '−{frictionCoefficient} × {depth} / [({outerSpan#} − {innerSpan#}) mm / 2]',
  },
  source: { text: 'Statics, full sliding', tag: 're-derived' },
  run: (given) => ({ relativeStressError: fourPointFrictionError(bar(given)) }),
  cautions: frictionCautions,
};
