import { relativeStrain } from '../bending/relative-strain.ts';
import { deflectionCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  deflectionMm: numberGiven(given, 'deflection'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
});

export const strainDeflection4Relative: Method = {
  id: 'strain.deflection4.relative',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: strain from mid-span against the inner rollers',
  inputs: [checkInputs.depth, checkInputs.deflection, checkInputs.innerSpan],
  outputs: [checkOutputs.strain],
  mainOutput: 'strain',
  formula: { symbols: '4dδ / l²', template: () => '4 × {depth} × {deflection} / ({innerSpan})²' },
  source: { text: 'Beam theory', tag: 're-derived' },
  run: (given) => ({ strain: relativeStrain(bar(given)) }),
  cautions: (given) => deflectionCautions(given, 'innerSpan'),
};
