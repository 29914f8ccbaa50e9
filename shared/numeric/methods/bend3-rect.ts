import { threePointBendingStressMPa } from '../bending/three-point-bending-stress.ts';
import { threePointBendingSensitivities } from '../uncertainty/three-point-bending-sensitivities.ts';
import { sectionCautions, slenderness3Cautions } from './bar-cautions.ts';
import { barInputs } from './bar-inputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
});

export const bend3Rect: Method = {
  id: 'bend3.rect',
  version: 1,
  line: 'load',
  title: 'Three-point bar, at mid-span on the tensile face',
  inputs: [barInputs.load, barInputs.outerSpan, barInputs.width, barInputs.depth],
  outputs: [{ name: 'stress', label: 'Stress on the tensile face', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: { symbols: '3FL / 2bd²', template: () => '3 × {load} × {outerSpan} / (2 × {width} × ({depth})²)' },
  source: { text: 'Beam theory, M c / I with M = F L / 4', tag: 're-derived' },
  run: (given) => ({ stress: threePointBendingStressMPa(bar(given)) }),
  sensitivities: (given) => threePointBendingSensitivities(bar(given)),
  cautions: (given) => [...sectionCautions(given), ...slenderness3Cautions(given)],
};
