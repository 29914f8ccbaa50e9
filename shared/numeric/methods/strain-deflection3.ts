import { threePointStrain } from '../bending/three-point-strain.ts';
import { deflectionCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  deflectionMm: numberGiven(given, 'deflection'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
});

export const strainDeflection3: Method = {
  id: 'strain.deflection3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: strain from the deflection',
  inputs: [checkInputs.depth, checkInputs.deflection, checkInputs.outerSpan],
  outputs: [checkOutputs.strain],
  mainOutput: 'strain',
  formula: { symbols: '6dδ / L²', template: () => '6 × {depth} × {deflection} / ({outerSpan})²' },
  source: { text: 'Beam theory', tag: 're-derived' },
  run: (given) => ({ strain: threePointStrain(bar(given)) }),
  cautions: (given) => deflectionCautions(given, 'outerSpan'),
};
