import { fourPointBendingStressMPa } from '../bending/four-point-bending-stress.ts';
import { fourPointBendingSensitivities } from '../uncertainty/four-point-bending-sensitivities.ts';
import { sectionCautions, slenderness4Cautions } from './bar-cautions.ts';
import { barInputs } from './bar-inputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
});

export const bend4Rect: Method = {
  id: 'bend4.rect',
  version: 1,
  line: 'load',
  title: 'Four-point bar, between the inner rollers on the tensile face',
  inputs: [barInputs.load, barInputs.outerSpan, barInputs.innerSpan, barInputs.width, barInputs.depth],
  outputs: [{ name: 'stress', label: 'Stress on the tensile face', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: {
    symbols: '3F(L − l) / 2bd²',
    template: () => '3 × {load} × ({outerSpan#} − {innerSpan#}) mm / (2 × {width} × ({depth})²)',
  },
  source: { text: 'Beam theory, M c / I with M = F (L − l) / 4', tag: 're-derived' },
  run: (given) => ({ stress: fourPointBendingStressMPa(bar(given)) }),
  sensitivities: (given) => fourPointBendingSensitivities(bar(given)),
  cautions: (given) => [...sectionCautions(given), ...slenderness4Cautions(given)],
};
