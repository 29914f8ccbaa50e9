import { halfChamferedSection } from '../bending/half-chamfered-section.ts';
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

export const bendChamfer2: Method = {
  id: 'bend.chamfer2',
  version: 1,
  line: 'supporting',
  title: 'Bar with two chamfers on the tensile edges: factor on the stress',
  inputs: [checkInputs.width, checkInputs.depth, checkInputs.chamferLeg],
  outputs: [
    checkOutputs.secondMoment,
    { name: 'tensileFibreDistance', label: 'Tensile face from the axis', symbol: 'd/2 + δ', unit: 'mm' },
    checkOutputs.stressFactor,
  ],
  mainOutput: 'stressFactor',
  formula: {
    symbols: '(bd³/12)/I · (d/2 + δ)/(d/2), δ = c²(d/2 − c/3)/(bd − c²)',
    template: () => '({width} × ({depth})³ / 12) / I × (d/2 + δ) / (d/2) with c = {chamferLeg}',
  },
  source: { text: 'Width integrated, with the shift of the axis', tag: 're-derived' },
  run: (given) => {
    const { secondMomentMm4, tensileFibreMm, stressFactor } = halfChamferedSection(section(given));
    return { secondMoment: secondMomentMm4, tensileFibreDistance: tensileFibreMm, stressFactor };
  },
  cautions: (_given, outputs) => edgeCautions(outputs),
};
