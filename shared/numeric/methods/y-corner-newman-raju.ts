import { cornerCrackFront } from '../fracture/shape-factors/corner-crack-front.ts';
import { cornerCrackPoint } from '../fracture/shape-factors/corner-crack-point.ts';
import { statedRangeCautions } from './crack-cautions.ts';
import { crackInputs, loadModeInput, loadModes } from './crack-inputs.ts';
import { crackTemplate, governingPlace, pointOutputs, pointToOutputs } from './crack-outputs.ts';
import { choiceGiven, numberGiven, optionalNumberGiven } from './given.ts';
import type { GivenInputs, Method, Outputs } from './method.ts';

const crack = (given: GivenInputs) => ({
  flawDepthMm: numberGiven(given, 'a'),
  flawLengthMm: numberGiven(given, 'c'),
  thicknessMm: numberGiven(given, 't'),
  widthMm: optionalNumberGiven(given, 'width'),
  mode: choiceGiven(given, 'mode', loadModes),
});

function run(given: GivenInputs): Outputs {
  const front = cornerCrackFront(crack(given));
  const whole = {
    Yphi0: front.firstEndFactor,
    Yphi90: front.secondEndFactor,
    Ymax: front.largestFactor,
    phiMax: front.largestAtDegrees,
    governs: governingPlace(front, 'along-width', 'along-depth'),
  };
  const angleDegrees = optionalNumberGiven(given, 'phi');
  if (angleDegrees === undefined) return whole;
  return { ...whole, ...pointToOutputs(cornerCrackPoint({ ...crack(given), angleDegrees })) };
}

export const yCornerNewmanRaju: Method = {
  id: 'Y.corner.newmanRaju',
  version: 1,
  line: 'supporting',
  title: 'Shape factor of a quarter-elliptical corner crack',
  inputs: [
    crackInputs.depth,
    crackInputs.cornerLength,
    crackInputs.thickness,
    crackInputs.width,
    loadModeInput,
    crackInputs.angle,
  ],
  outputs: [
    { name: 'Yphi0', label: 'Shape factor on the face along the width', symbol: 'Y', unit: '1' },
    { name: 'Yphi90', label: 'Shape factor on the face along the depth', symbol: 'Y', unit: '1' },
    { name: 'Ymax', label: 'Largest shape factor on the front', symbol: 'Ymax', unit: '1' },
    { name: 'phiMax', label: 'Place of the largest', symbol: 'φ', unit: '°' },
    { name: 'governs', label: 'Which place governs', symbol: '', unit: null },
    ...pointOutputs,
  ],
  mainOutput: 'Ymax',
  formula: { symbols: 'F·√(π/Q) in tension, F·H·√(π/Q) in bending; the largest on the front', template: crackTemplate },
  source: {
    text: 'Newman and Raju, NASA TM-85793 (1984), eqs 37–51, coefficients as in three public implementations, bending terms in two; c/b < 0.5 with the full width, 0.2 ≤ a/c ≤ 2 from memory',
    tag: 'looked up',
  },
  run,
  cautions: (given) =>
    statedRangeCautions(
      numberGiven(given, 'a') / numberGiven(given, 'c'),
      numberGiven(given, 'a') / numberGiven(given, 't'),
    ),
};
