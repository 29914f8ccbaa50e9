import { fourPointStrain } from '../bending/four-point-strain.ts';
import { deflectionCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  depthMm: numberGiven(given, 'depth'),
  deflectionMm: numberGiven(given, 'deflection'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
});

export const strainDeflection4Midspan: Method = {
  id: 'strain.deflection4.midspan',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: strain from the deflection of mid-span',
  inputs: [checkInputs.depth, checkInputs.deflection, checkInputs.outerSpan, checkInputs.innerSpan],
  outputs: [checkOutputs.strain],
  mainOutput: 'strain',
  formula: {
    symbols: '12dδ / (3L² − 4a²), a = (L − l)/2',
    template: () => '12 × {depth} × {deflection} / (3 × ({outerSpan})² − ({outerSpan#} − {innerSpan#})² mm²)',
  },
  source: { text: 'Beam theory', tag: 're-derived' },
  run: (given) => ({ strain: fourPointStrain(bar(given), 'mid-span') }),
  cautions: (given) => deflectionCautions(given, 'outerSpan'),
};
