import { surfaceCrackFront } from '../fracture/shape-factors/surface-crack-front.ts';
import { surfaceCrackPoint } from '../fracture/shape-factors/surface-crack-point.ts';
import { statedRangeCautions, surfaceGovernsCautions } from './crack-cautions.ts';
import { crackInputs, loadModeInput, loadModes } from './crack-inputs.ts';
import { crackTemplate, governingPlace, pointOutputs, pointToOutputs } from './crack-outputs.ts';
import { choiceGiven, numberGiven, optionalNumberGiven } from './given.ts';
import type { GivenInputs, Method, Outputs } from './method.ts';

const crack = (given: GivenInputs) => ({
  flawDepthMm: numberGiven(given, 'a'),
  flawHalfLengthMm: numberGiven(given, 'c'),
  thicknessMm: numberGiven(given, 't'),
  halfWidthMm: optionalNumberGiven(given, 'halfWidth'),
  mode: choiceGiven(given, 'mode', loadModes),
});

function run(given: GivenInputs): Outputs {
  const front = surfaceCrackFront(crack(given));
  const whole = {
    Ysurface: front.firstEndFactor,
    Ydeepest: front.secondEndFactor,
    Ymax: front.largestFactor,
    phiMax: front.largestAtDegrees,
    governs: governingPlace(front, 'surface', 'deepest'),
  };
  const angleDegrees = optionalNumberGiven(given, 'phi');
  if (angleDegrees === undefined) return whole;
  return { ...whole, ...pointToOutputs(surfaceCrackPoint({ ...crack(given), angleDegrees })) };
}

export const ySurfaceNewmanRaju: Method = {
  id: 'Y.surface.newmanRaju',
  version: 1,
  line: 'supporting',
  title: 'Shape factor of a half-elliptical surface crack',
  inputs: [
    crackInputs.depth,
    crackInputs.halfLength,
    crackInputs.thickness,
    crackInputs.halfWidth,
    loadModeInput,
    crackInputs.angle,
  ],
  outputs: [
    { name: 'Ysurface', label: 'Shape factor at the surface', symbol: 'Y', unit: '1' },
    { name: 'Ydeepest', label: 'Shape factor at the deepest point', symbol: 'Y', unit: '1' },
    { name: 'Ymax', label: 'Largest shape factor on the front', symbol: 'Ymax', unit: '1' },
    { name: 'phiMax', label: 'Place of the largest', symbol: 'φ', unit: '°' },
    { name: 'governs', label: 'Which place governs', symbol: '', unit: null },
    ...pointOutputs,
  ],
  mainOutput: 'Ymax',
  formula: { symbols: 'F·√(π/Q) in tension, F·H·√(π/Q) in bending; the largest on the front', template: crackTemplate },
  source: {
    text: 'Newman and Raju, NASA TM-83200 (1981), TM-85793 (1984), coefficients as in about ten public implementations; ±5 % for 0.2 ≤ a/c ≤ 2, a/t ≤ 0.8, c/b < 0.5',
    tag: 'looked up',
  },
  run,
  cautions: (given, outputs) => [
    ...statedRangeCautions(
      numberGiven(given, 'a') / numberGiven(given, 'c'),
      numberGiven(given, 'a') / numberGiven(given, 't'),
    ),
    ...surfaceGovernsCautions(outputs.governs),
  ],
};
