import { roundedSection } from '../bending/rounded-section.ts';
import { edgeCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const section = (given: GivenInputs) => ({
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  edgeRadiusMm: numberGiven(given, 'edgeRadius'),
});

export const bendRound4: Method = {
  id: 'bend.round4',
  version: 1,
  line: 'supporting',
  title: 'Bar with four rounded edges: factor on the stress',
  inputs: [checkInputs.width, checkInputs.depth, checkInputs.edgeRadius],
  outputs: [checkOutputs.secondMoment, checkOutputs.stressFactor],
  mainOutput: 'stressFactor',
  formula: {
    symbols: '(bd³/12) / I, I with quarter-round edges of radius r',
    template: () => '({width} × ({depth})³ / 12) / I with r = {edgeRadius}',
  },
  source: { text: 'Width integrated over the depth', tag: 're-derived' },
  run: (given) => {
    const { secondMomentMm4, stressFactor } = roundedSection(section(given));
    return { secondMoment: secondMomentMm4, stressFactor };
  },
  cautions: (_given, outputs) => edgeCautions(outputs),
};
