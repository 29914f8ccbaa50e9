import { fourPointRodLocalStress } from '../bending/four-point-rod-local-stress.ts';
import { fourPointRodLocalSensitivities } from '../uncertainty/four-point-rod-local-sensitivities.ts';
import { fourPointArms } from './four-point-arms.ts';
import { numberGiven } from './given.ts';
import { localStressOutputs, localStressToOutputs } from './local-stress-outputs.ts';
import type { GivenInputs, Method } from './method.ts';
import { rod4LocalCautions } from './rod-cautions.ts';
import { rodInputs } from './rod-inputs.ts';

const rod = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  diameterMm: numberGiven(given, 'diameter'),
  xMm: numberGiven(given, 'x'),
  yMm: numberGiven(given, 'y'),
});

export const bend4RodLocal: Method = {
  id: 'bend4.rod.local',
  version: 1,
  line: 'load',
  title: 'Four-point rod, at the origin',
  inputs: [rodInputs.load, rodInputs.outerSpan, rodInputs.innerSpan, rodInputs.diameter, rodInputs.x, rodInputs.y],
  outputs: localStressOutputs,
  mainOutput: 'localStress',
  formula: {
    symbols: '8F(L − l) / πD³ · m(x) · (1 − 2y/D)',
    template: (given) => `8 × {load} × ${fourPointArms(given)} mm / (π × ({diameter})³) × (1 − 2 × {y} / {diameter})`,
  },
  source: { text: 'Beam theory, M(x) (D/2 − y) / I', tag: 're-derived' },
  run: (given) => localStressToOutputs(fourPointRodLocalStress(rod(given))),
  sensitivities: (given) => fourPointRodLocalSensitivities(rod(given)),
  cautions: rod4LocalCautions,
};
