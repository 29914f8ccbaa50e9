import { mirrorFlawRatio as ratioOf } from '../mirror/flaw-ratio.ts';
import { numberGiven } from './given.ts';
import type { Caution, Method, Outputs } from './method.ts';
import { mirrorInputs } from './mirror-inputs.ts';

// Trade practice: most glasses 10 to 13, polycrystals 6 to 20.
const usual = { least: 5, most: 25 };

function cautions(outputs: Outputs): Caution[] {
  const { ratio } = outputs;
  if (typeof ratio !== 'number' || (ratio >= usual.least && ratio <= usual.most)) return [];
  const sentence = `A mirror ${ratio.toFixed(1)} times the flaw is outside ${usual.least} to ${usual.most}: the flaw or the boundary may be misread, the flaw may have grown, or residual stress acts.`;
  return [{ code: 'unusual-flaw-ratio', weight: 'warning', sentence }];
}

export const mirrorFlawRatio: Method = {
  id: 'mirror.flawRatio',
  version: 1,
  line: 'supporting',
  title: 'Mirror radius over flaw size',
  inputs: [mirrorInputs.A, mirrorInputs.KIc, mirrorInputs.Y],
  outputs: [{ name: 'ratio', label: 'Mirror radius over flaw size', symbol: 'R/c', unit: '1' }],
  mainOutput: 'ratio',
  formula: { symbols: '(A Y / KIc)²', template: () => '({A} × {Y} / {KIc})²' },
  source: { text: 'σ√R = A and KIc = Yσ√c at one stress', tag: 're-derived' },
  run: (given) => ({
    ratio: ratioOf({
      mirrorConstantMPaRootM: numberGiven(given, 'A'),
      toughnessMPaRootM: numberGiven(given, 'KIc'),
      shapeFactor: numberGiven(given, 'Y'),
    }),
  }),
  cautions: (_given, outputs) => cautions(outputs),
};
