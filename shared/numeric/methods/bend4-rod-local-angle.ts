import { fourPointRodAngleStress } from '../bending/four-point-rod-angle-stress.ts';
import { fourPointRodAngleSensitivities } from '../uncertainty/four-point-rod-angle-sensitivities.ts';
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
  angleDeg: numberGiven(given, 'angle'),
});

export const bend4RodLocalAngle: Method = {
  id: 'bend4.rod.local.angle',
  version: 1,
  line: 'load',
  title: 'Four-point rod, at an origin round the surface',
  inputs: [rodInputs.load, rodInputs.outerSpan, rodInputs.innerSpan, rodInputs.diameter, rodInputs.x, rodInputs.angle],
  outputs: [{ name: 'y', label: 'Origin above the lowest fibre', symbol: 'y', unit: 'mm' }, ...localStressOutputs],
  mainOutput: 'localStress',
  formula: {
    symbols: '8F(L − l) / πD³ · m(x) · cos θ',
    template: (given) => `8 × {load} × ${fourPointArms(given)} mm / (π × ({diameter})³) × cos {angle}`,
  },
  source: { text: 'Beam theory, M(x) (D/2) cos θ / I', tag: 're-derived' },
  run: (given) => {
    const stress = fourPointRodAngleStress(rod(given));
    return { y: stress.yMm, ...localStressToOutputs(stress) };
  },
  sensitivities: (given) => fourPointRodAngleSensitivities(rod(given)),
  cautions: rod4LocalCautions,
};
