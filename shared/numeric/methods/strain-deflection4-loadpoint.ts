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

export const strainDeflection4Loadpoint: Method = {
  id: 'strain.deflection4.loadpoint',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: strain from the deflection of the inner rollers',
  inputs: [checkInputs.depth, checkInputs.deflection, checkInputs.outerSpan, checkInputs.innerSpan],
  outputs: [checkOutputs.strain],
  mainOutput: 'strain',
  formula: {
    symbols: '3dδ / [a(3L − 4a)], a = (L − l)/2',
    template: () =>
      '3 × {depth} × {deflection} / [a × (3 × {outerSpan} − 4a)], a = ({outerSpan#} − {innerSpan#}) mm / 2',
  },
  source: { text: 'Beam theory', tag: 're-derived' },
  run: (given) => ({ strain: fourPointStrain(bar(given), 'inner rollers') }),
  cautions: (given) => deflectionCautions(given, 'outerSpan'),
};
