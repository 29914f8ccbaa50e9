import { fourPointLocalStress } from '../bending/four-point-local-stress.ts';
import { fourPointLocalSensitivities } from '../uncertainty/four-point-local-sensitivities.ts';
import { compressionCautions, position4Cautions, sectionCautions, slenderness4Cautions } from './bar-cautions.ts';
import { barInputs } from './bar-inputs.ts';
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

/** Between the inner rollers the arm is (L − l); outside them it is (L − 2|x|), and l drops out. */
function template(given: GivenInputs): string {
  const inside = Math.abs(numberGiven(given, 'x')) <= numberGiven(given, 'innerSpan') / 2;
  const arms = inside ? '({outerSpan#} − {innerSpan#})' : '({outerSpan#} − 2 × |{x#}|)';
  return `3 × {load} × ${arms} mm / (2 × {width} × ({depth})²) × (1 − 2 × {y} / {depth})`;
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
