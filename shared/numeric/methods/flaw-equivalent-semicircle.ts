import { equivalentSemicircle } from '../fracture/equivalent-semicircle.ts';
import { statedRangeCautions } from './crack-cautions.ts';
import { crackInputs } from './crack-inputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const flawEquivalentSemicircle: Method = {
  id: 'flaw.equivalentSemicircle',
  version: 1,
  line: 'supporting',
  title: 'Half-circle that stands for a surface flaw',
  inputs: [{ ...crackInputs.depth, limits: 'more than 0, at most twice the half-length' }, crackInputs.halfLength],
  outputs: [
    { name: 'areaEquivalentRadius', label: 'Radius of the same area', symbol: 'r', unit: 'mm' },
    { name: 'KEquivalentRadius', label: 'Radius of the same stress intensity', symbol: 'r', unit: 'mm' },
  ],
  mainOutput: 'KEquivalentRadius',
  formula: {
    symbols: 'a (Ymax / Ymax of the half-circle)²; √(a·c) by area',
    template: () => '{a} × (Ymax at a/c = {a#} / {c#} over Ymax at 1)²; √({a} × {c})',
  },
  source: {
    text: 'Irwin’s equivalence with Newman and Raju’s Ymax, small flaw in tension; area form as common for glass',
    tag: 're-derived',
  },
  run: (given) => {
    const { byAreaMm, byIntensityMm } = equivalentSemicircle({
      flawDepthMm: numberGiven(given, 'a'),
      flawHalfLengthMm: numberGiven(given, 'c'),
    });
    return { areaEquivalentRadius: byAreaMm, KEquivalentRadius: byIntensityMm };
  },
  cautions: (given) => statedRangeCautions(numberGiven(given, 'a') / numberGiven(given, 'c'), 0),
};
