import { fourPointRodStressMPa } from '../bending/four-point-rod-stress.ts';
import { fourPointRodSensitivities } from '../uncertainty/four-point-rod-sensitivities.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';
import { rod4Cautions } from './rod-cautions.ts';
import { rodInputs } from './rod-inputs.ts';

const rod = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  diameterMm: numberGiven(given, 'diameter'),
});

export const bend4Rod: Method = {
  id: 'bend4.rod',
  version: 1,
  line: 'load',
  title: 'Four-point rod, between the inner rollers on the lowest fibre',
  inputs: [rodInputs.load, rodInputs.outerSpan, rodInputs.innerSpan, rodInputs.diameter],
  outputs: [{ name: 'stress', label: 'Stress on the lowest fibre', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: {
    symbols: '8F(L − l) / πD³',
    template: () => '8 × {load} × ({outerSpan#} − {innerSpan#}) mm / (π × ({diameter})³)',
  },
  source: { text: 'Beam theory, M c / I with M = F (L − l) / 4 and a round section', tag: 're-derived' },
  run: (given) => ({ stress: fourPointRodStressMPa(rod(given)) }),
  sensitivities: (given) => fourPointRodSensitivities(rod(given)),
  cautions: rod4Cautions,
};
