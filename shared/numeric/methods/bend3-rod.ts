import { threePointRodStressMPa } from '../bending/three-point-rod-stress.ts';
import { threePointRodSensitivities } from '../uncertainty/three-point-rod-sensitivities.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';
import { rod3Cautions } from './rod-cautions.ts';
import { rodInputs } from './rod-inputs.ts';

const rod = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  diameterMm: numberGiven(given, 'diameter'),
});

export const bend3Rod: Method = {
  id: 'bend3.rod',
  version: 1,
  line: 'load',
  title: 'Three-point rod, at mid-span on the lowest fibre',
  inputs: [rodInputs.load, rodInputs.outerSpan, rodInputs.diameter],
  outputs: [{ name: 'stress', label: 'Stress on the lowest fibre', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: { symbols: '8FL / πD³', template: () => '8 × {load} × {outerSpan} / (π × ({diameter})³)' },
  source: { text: 'Beam theory, M c / I with M = F L / 4 and a round section', tag: 're-derived' },
  run: (given) => ({ stress: threePointRodStressMPa(rod(given)) }),
  sensitivities: (given) => threePointRodSensitivities(rod(given)),
  cautions: rod3Cautions,
};
