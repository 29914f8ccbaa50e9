import { threePointLocalStress } from '../bending/three-point-local-stress.ts';
import { threePointLocalSensitivities } from '../uncertainty/three-point-local-sensitivities.ts';
import { compressionCautions, position3Cautions, sectionCautions, slenderness3Cautions } from './bar-cautions.ts';
import { barInputs } from './bar-inputs.ts';
import { numberGiven } from './given.ts';
import { localStressOutputs, localStressToOutputs } from './local-stress-outputs.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  xMm: numberGiven(given, 'x'),
  yMm: numberGiven(given, 'y'),
});

export const bend3RectLocal: Method = {
  id: 'bend3.rect.local',
  version: 1,
  line: 'load',
  title: 'Three-point bar, at the origin',
  inputs: [barInputs.load, barInputs.outerSpan, barInputs.width, barInputs.depth, barInputs.x, barInputs.y],
  outputs: localStressOutputs,
  mainOutput: 'localStress',
  formula: {
    symbols: '3FL / 2bd² · (1 − 2|x|/L) · (1 − 2y/d)',
    template: () =>
      '3 × {load} × {outerSpan} / (2 × {width} × ({depth})²) × (1 − 2 × |{x#}| mm / {outerSpan}) × (1 − 2 × {y} / {depth})',
  },
  source: { text: 'Beam theory, M(x) (d/2 − y) / I', tag: 're-derived' },
  run: (given) => localStressToOutputs(threePointLocalStress(bar(given))),
  sensitivities: (given) => threePointLocalSensitivities(bar(given)),
  cautions: (given, outputs) => [
    ...sectionCautions(given),
    ...slenderness3Cautions(given),
    ...compressionCautions(outputs),
    ...position3Cautions(given),
  ],
};
