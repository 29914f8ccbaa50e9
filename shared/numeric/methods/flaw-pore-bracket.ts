import { poreBracket } from '../fracture/pore-bracket.ts';
import { flawInputs } from './flaw-inputs.ts';
import { numberGiven } from './given.ts';
import type { Caution, Method } from './method.ts';

const interpolation: Caution = {
  code: 'interpolation-of-practice',
  weight: 'note',
  sentence: 'The smaller of two bounds, an interpolation of practice and not a published solution.',
};

export const flawPoreBracket: Method = {
  id: 'flaw.pore.bracket',
  version: 1,
  line: 'supporting',
  title: 'Stress intensity of a pore with a crack round it',
  inputs: [flawInputs.poreRadius, flawInputs.crackLength, flawInputs.poisson],
  outputs: [
    { name: 'concentration', label: 'Stress concentration of the pore', symbol: 'Kt', unit: '1' },
    { name: 'KperStressSmallCrack', label: 'K over stress, short crack at the wall', symbol: 'K/σ', unit: '√m' },
    { name: 'KperStressPenny', label: 'K over stress, round crack of the whole', symbol: 'K/σ', unit: '√m' },
    { name: 'KperStress', label: 'K over stress, the smaller', symbol: 'K/σ', unit: '√m' },
  ],
  mainOutput: 'KperStress',
  formula: {
    symbols: 'min[1.1215·Kt·√(πℓ), (2/√π)·√(R + ℓ)], Kt = (27 − 15ν) / (2(7 − 5ν))',
    template: () =>
      'min[1.1215 × Kt × √(π × {crackLength@m}), 2 / √π × √({poreRadius@m} + {crackLength@m})], Kt = (27 − 15 × {poisson}) / (2 × (7 − 5 × {poisson}))',
  },
  source: { text: 'Own interpolation between Goodier’s cavity (from memory) and the penny crack', tag: 'practice' },
  run: (given) => {
    const bracket = poreBracket({
      poreRadiusMm: numberGiven(given, 'poreRadius'),
      crackLengthMm: numberGiven(given, 'crackLength'),
      poissonRatio: numberGiven(given, 'poisson'),
    });
    return {
      concentration: bracket.concentration,
      KperStressSmallCrack: bracket.shortCrackRootM,
      KperStressPenny: bracket.pennyRootM,
      KperStress: bracket.smallerRootM,
    };
  },
  cautions: () => [interpolation],
};
