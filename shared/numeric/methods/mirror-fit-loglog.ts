import { fitExponent } from '../mirror/fit-exponent.ts';
import type { Caution, GivenInputs, Method, Outputs } from './method.ts';
import { lotInputs } from './mirror-inputs.ts';
import { mirrorLotCautions, mirrorLotGiven, mirrorsInWords } from './mirror-lot-given.ts';

function cautions(given: GivenInputs, outputs: Outputs): Caution[] {
  const found = mirrorLotCautions(given);
  const { tAgainstMinusHalf: t, t975: limit } = outputs;
  if (typeof t !== 'number' || typeof limit !== 'number' || Math.abs(t) < limit) return found;
  const sentence = `The exponent is not −½ (|t| is ${Math.abs(t).toFixed(1)}, the limit ${limit.toFixed(2)}): suspect large mirrors, flaws that are not small against them, or residual stress.`;
  return [...found, { code: 'exponent-not-minus-half', weight: 'warning', sentence }];
}

export const mirrorFitLoglog: Method = {
  id: 'mirror.fit.loglog',
  version: 1,
  line: 'supporting',
  title: 'Exponent of the mirror radius in a lot',
  inputs: lotInputs(3),
  outputs: [
    { name: 'exponent', label: 'Exponent of the radius', symbol: 'm', unit: '1' },
    { name: 'uExponent', label: 'Standard uncertainty of the exponent', symbol: 'u(m)', unit: '1' },
    { name: 'tAgainstMinusHalf', label: 'Distance from −½ over its uncertainty', symbol: 't', unit: '1' },
    { name: 't975', label: 'Limit of |t| at 95 %', symbol: 't₀.₉₇₅', unit: '1' },
  ],
  mainOutput: 'exponent',
  formula: {
    symbols: 'ln σ = ln A + m ln R',
    template: (given) => `ln σ = ln A + m ln R through ${mirrorsInWords(given)}`,
  },
  source: { text: 'Ordinary least squares of ln σ on ln R', tag: 're-derived' },
  run: (given) => {
    const { exponent, uExponent, tAgainstMinusHalf, t975 } = fitExponent(mirrorLotGiven(given));
    return { exponent, uExponent, ...(tAgainstMinusHalf !== undefined && { tAgainstMinusHalf }), t975 };
  },
  cautions,
};
