import { fourPointModulus } from '../bending/four-point-modulus.ts';
import { apparentModulusCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  slopeNPerMm: numberGiven(given, 'slope'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  machineMmPerN: numberGiven(given, 'machineCompliance'),
});

export const modulusSlope4Midspan: Method = {
  id: 'modulus.slope4.midspan',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: modulus from the slope at mid-span',
  inputs: [
    checkInputs.slope,
    checkInputs.outerSpan,
    checkInputs.innerSpan,
    checkInputs.width,
    checkInputs.depth,
    checkInputs.machineCompliance,
  ],
  outputs: [checkOutputs.specimenSlope, checkOutputs.modulus],
  mainOutput: 'modulus',
  formula: {
    symbols: 'ka(3L² − 4a²) / 4bd³, a = (L − l)/2, 1/k = 1/k₀ − C',
    template: () =>
      'k × a × (3 × ({outerSpan})² − 4a²) / (4 × {width} × ({depth})³), a = ({outerSpan#} − {innerSpan#}) mm / 2, 1/k = 1/({slope}) − {machineCompliance}',
  },
  source: { text: 'Beam theory', tag: 're-derived' },
  run: (given) => {
    const { specimenSlopeNPerMm, modulusGPa } = fourPointModulus(bar(given), 'mid-span');
    return { specimenSlope: specimenSlopeNPerMm, modulus: modulusGPa };
  },
  cautions: apparentModulusCautions,
};
