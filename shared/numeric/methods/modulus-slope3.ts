import { threePointModulus } from '../bending/three-point-modulus.ts';
import { apparentModulusCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  slopeNPerMm: numberGiven(given, 'slope'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  machineMmPerN: numberGiven(given, 'machineCompliance'),
});

export const modulusSlope3: Method = {
  id: 'modulus.slope3',
  version: 1,
  line: 'supporting',
  title: 'Three-point bar: modulus from the slope',
  inputs: [
    checkInputs.slope,
    checkInputs.outerSpan,
    checkInputs.width,
    checkInputs.depth,
    checkInputs.machineCompliance,
  ],
  outputs: [checkOutputs.specimenSlope, checkOutputs.modulus],
  mainOutput: 'modulus',
  formula: {
    symbols: 'kL³ / 4bd³, 1/k = 1/k₀ − C',
    template: () => 'k × ({outerSpan})³ / (4 × {width} × ({depth})³), 1/k = 1/({slope}) − {machineCompliance}',
  },
  source: { text: 'Beam theory', tag: 're-derived' },
  run: (given) => {
    const { specimenSlopeNPerMm, modulusGPa } = threePointModulus(bar(given));
    return { specimenSlope: specimenSlopeNPerMm, modulus: modulusGPa };
  },
  cautions: apparentModulusCautions,
};
