import { embeddedCrackFront } from '../fracture/shape-factors/embedded-crack-front.ts';
import { crackInputs } from './crack-inputs.ts';
import { governingPlace } from './crack-outputs.ts';
import { numberGiven, optionalNumberGiven } from './given.ts';
import type { Caution, Method } from './method.ts';

const copiesDiffer: Caution = {
  code: 'copies-differ',
  weight: 'note',
  sentence:
    'The public copies of this equation differ in one term: trust it no more than to a few per cent in a thin section.',
};

export const yEmbeddedNewmanRaju: Method = {
  id: 'Y.embedded.newmanRaju',
  version: 1,
  line: 'supporting',
  title: 'Shape factor of an elliptical crack in the middle of a plate',
  inputs: [
    crackInputs.halfDepth,
    { ...crackInputs.halfLength, limits: 'at least the half-depth; half of the crack along the width' },
    crackInputs.thickness,
    crackInputs.halfWidth,
  ],
  outputs: [
    { name: 'Yphi0', label: 'Shape factor at the end of the length', symbol: 'Y', unit: '1' },
    { name: 'Yphi90', label: 'Shape factor at the end of the depth', symbol: 'Y', unit: '1' },
    { name: 'Ymax', label: 'Largest shape factor on the front', symbol: 'Ymax', unit: '1' },
    { name: 'phiMax', label: 'Place of the largest', symbol: 'φ', unit: '°' },
    { name: 'governs', label: 'Which place governs', symbol: '', unit: null },
  ],
  mainOutput: 'Ymax',
  formula: {
    symbols: 'F·√(π/Q), the largest on the front',
    template: () => 'F × √(π / Q) at a/c = {a#} / {c#}, 2a/t = 2 × {a#} / {t#}',
  },
  source: {
    text: 'Newman and Raju, NASA TM-83200 (1981), TM-85793 (1984), form of the public implementations that carry the full term; tension, crack centred in the thickness',
    tag: 'looked up',
  },
  run: (given) => {
    const front = embeddedCrackFront({
      flawHalfDepthMm: numberGiven(given, 'a'),
      flawHalfLengthMm: numberGiven(given, 'c'),
      thicknessMm: numberGiven(given, 't'),
      halfWidthMm: optionalNumberGiven(given, 'halfWidth'),
    });
    return {
      Yphi0: front.firstEndFactor,
      Yphi90: front.secondEndFactor,
      Ymax: front.largestFactor,
      phiMax: front.largestAtDegrees,
      governs: governingPlace(front, 'length-end', 'depth-end'),
    };
  },
  cautions: () => [copiesDiffer],
};
