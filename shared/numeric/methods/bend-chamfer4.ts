import { chamferedSection } from '../bending/chamfered-section.ts';
import { edgeCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const section = (given: GivenInputs) => ({
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  chamferLegMm: numberGiven(given, 'chamferLeg'),
});

export const bendChamfer4: Method = {
  id: 'bend.chamfer4',
  version: 1,
  line: 'supporting',
  title: 'Bar with four chamfers: factor on the stress',
  inputs: [checkInputs.width, checkInputs.depth, checkInputs.chamferLeg],
  outputs: [checkOutputs.secondMoment, checkOutputs.stressFactor],
  mainOutput: 'stressFactor',
  formula: {
    symbols: '(bd³/12) / I, I = bd³/12 − (c²/9)[c² + ½(3d − 2c)²]',
    template: () => '({width} × ({depth})³ / 12) / I with c = {chamferLeg}',
  },
  source: { text: 'Form of the ASTM C1161 annex (from memory), equal to integrating the width', tag: 're-derived' },
  run: (given) => {
    const { secondMomentMm4, stressFactor } = chamferedSection(section(given));
    return { secondMoment: secondMomentMm4, stressFactor };
  },
  cautions: (_given, outputs) => edgeCautions(outputs),
};
