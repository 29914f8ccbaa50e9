import { fourPointLocalStress } from '../bending/four-point-local-stress.ts';
import { fourPointLocalSensitivities } from '../uncertainty/four-point-local-sensitivities.ts';
import { compressionCautions, position4Cautions, sectionCautions, slenderness4Cautions } from './bar-cautions.ts';
import { barInputs } from './bar-inputs.ts';
import { fourPointArms } from './four-point-arms.ts';
import { numberGiven } from './given.ts';
import { localStressOutputs, localStressToOutputs } from './local-stress-outputs.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  xMm: numberGiven(given, 'x'),
  yMm: numberGiven(given, 'y'),
});

function template(given: GivenInputs): string {
  return `3 × {load} × ${fourPointArms(given)} mm / (2 × {width} × ({depth})²) × (1 − 2 × {y} / {depth})`;
}

export const bend4RectLocal: Method = {
  id: 'bend4.rect.local',
  version: 1,
  line: 'load',
  title: 'Four-point bar, at the origin',
  inputs: [
    barInputs.load,
    barInputs.outerSpan,
    barInputs.innerSpan,
    barInputs.width,
    barInputs.depth,
    barInputs.x,
    barInputs.y,
  ],
  outputs: localStressOutputs,
  mainOutput: 'localStress',
  formula: { symbols: '3F(L − l) / 2bd² · m(x) · (1 − 2y/d)', template },
  source: { text: 'Beam theory, M(x) (d/2 − y) / I', tag: 're-derived' },
  run: (given) => localStressToOutputs(fourPointLocalStress(bar(given))),
  sensitivities: (given) => fourPointLocalSensitivities(bar(given)),
  cautions: (given, outputs) => [
    ...sectionCautions(given),
    ...slenderness4Cautions(given),
    ...compressionCautions(outputs),
    ...position4Cautions(given),
  ],
};
