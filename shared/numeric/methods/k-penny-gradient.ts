import { pennyInGradient } from '../fracture/penny-in-gradient.ts';
import { flawInputs } from './flaw-inputs.ts';
import { numberGiven } from './given.ts';
import type { Caution, Method, Outputs } from './method.ts';

function closedCautions({ Kmin }: Outputs): Caution[] {
  if (typeof Kmin !== 'number' || Kmin >= 0) return [];
  const sentence = 'The far side of the crack would be pressed shut: the largest value is then only an estimate.';
  return [{ code: 'front-partly-closed', weight: 'warning', sentence }];
}

export const kPennyGradient: Method = {
  id: 'K.penny.gradient',
  version: 1,
  line: 'supporting',
  title: 'Stress intensity of a round flaw in a stress gradient',
  inputs: [flawInputs.stressAtCentre, flawInputs.gradient, flawInputs.radius],
  outputs: [
    { name: 'Kmax', label: 'Largest stress intensity', symbol: 'Kmax', unit: 'MPa√m' },
    { name: 'Kmin', label: 'Smallest stress intensity', symbol: 'Kmin', unit: 'MPa√m' },
  ],
  mainOutput: 'Kmax',
  formula: {
    symbols: '(2/√π)·√a·(σc + ⅔·a·|g|)',
    template: () => '2 / √π × √({a@m}) × ({stressAtCentre} + 2/3 × {a} × |{gradient}|)',
  },
  source: { text: 'Weight function of the penny crack in a linear stress', tag: 're-derived' },
  run: (given) => {
    const { largestMPaRootM, smallestMPaRootM } = pennyInGradient({
      stressAtCentreMPa: numberGiven(given, 'stressAtCentre'),
      gradientMPaPerMm: numberGiven(given, 'gradient'),
      radiusMm: numberGiven(given, 'a'),
    });
    return { Kmax: largestMPaRootM, Kmin: smallestMPaRootM };
  },
  cautions: (_given, outputs) => closedCautions(outputs),
};
