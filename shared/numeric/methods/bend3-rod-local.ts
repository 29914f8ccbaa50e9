import { threePointRodLocalStress } from '../bending/three-point-rod-local-stress.ts';
import { threePointRodLocalSensitivities } from '../uncertainty/three-point-rod-local-sensitivities.ts';
import { numberGiven } from './given.ts';
import { localStressOutputs, localStressToOutputs } from './local-stress-outputs.ts';
import type { GivenInputs, Method } from './method.ts';
import { rod3LocalCautions } from './rod-cautions.ts';
import { rodInputs } from './rod-inputs.ts';

const rod = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  diameterMm: numberGiven(given, 'diameter'),
  xMm: numberGiven(given, 'x'),
  yMm: numberGiven(given, 'y'),
});

export const bend3RodLocal: Method = {
  id: 'bend3.rod.local',
  version: 1,
  line: 'load',
  title: 'Three-point rod, at the origin',
  inputs: [rodInputs.load, rodInputs.outerSpan, rodInputs.diameter, rodInputs.x, rodInputs.y],
  outputs: localStressOutputs,
  mainOutput: 'localStress',
  formula: {
    symbols: '8FL / πD³ · (1 − 2|x|/L) · (1 − 2y/D)',
    template: () =>
      '8 × {load} × {outerSpan} / (π × ({diameter})³) × (1 − 2 × |{x#}| mm / {outerSpan}) × (1 − 2 × {y} / {diameter})',
  },
  source: { text: 'Beam theory, M(x) (D/2 − y) / I', tag: 're-derived' },
  run: (given) => localStressToOutputs(threePointRodLocalStress(rod(given))),
  sensitivities: (given) => threePointRodLocalSensitivities(rod(given)),
  cautions: rod3LocalCautions,
};
