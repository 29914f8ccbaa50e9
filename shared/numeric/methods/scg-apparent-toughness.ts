import { slowTestToughness } from '../slow-growth/slow-test-toughness.ts';
import { flawInputs } from './flaw-inputs.ts';
import { numberGiven } from './given.ts';
import { growthInputs } from './growth-inputs.ts';
import type { Method } from './method.ts';

export const scgApparentToughness: Method = {
  id: 'scg.apparentToughness',
  version: 1,
  line: 'supporting',
  title: 'Apparent toughness of the first flaw in a slow test',
  inputs: [
    flawInputs.KIc,
    { ...growthInputs.stress, limits: 'more than 0, at most the inert strength' },
    growthInputs.inertStrength,
  ],
  outputs: [
    { name: 'apparentKIc', label: 'Apparent toughness', symbol: 'Kapp', unit: 'MPa√m' },
    { name: 'flawGrowthRatio', label: 'Last over first flaw size', symbol: 'cf/ci', unit: '1' },
  ],
  mainOutput: 'apparentKIc',
  formula: { symbols: 'KIc·σ/Si', template: () => '{KIc} × {stress} / {inertStrength}' },
  source: { text: 'Same first flaw at both stresses: K = Yσ√c', tag: 're-derived' },
  run: (given) => {
    const { apparentToughnessMPaRootM, flawGrowthRatio } = slowTestToughness({
      toughnessMPaRootM: numberGiven(given, 'KIc'),
      stressMPa: numberGiven(given, 'stress'),
      inertStrengthMPa: numberGiven(given, 'inertStrength'),
    });
    return { apparentKIc: apparentToughnessMPaRootM, flawGrowthRatio };
  },
  cautions: () => [],
};
