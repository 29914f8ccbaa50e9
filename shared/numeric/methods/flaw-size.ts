import { flawSizeMm } from '../fracture/flaw-size.ts';
import { flawInputs } from './flaw-inputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const flawSize: Method = {
  id: 'flaw.size',
  version: 1,
  line: 'supporting',
  title: 'Flaw size to look for at a stress',
  inputs: [flawInputs.KIc, flawInputs.shapeFactor, flawInputs.stress],
  outputs: [{ name: 'c', label: 'Flaw size', symbol: 'c', unit: 'mm' }],
  mainOutput: 'c',
  formula: { symbols: '(KIc / (Yσ))²', template: () => '({KIc} / ({Y} × {stress}))²' },
  source: { text: 'Stress intensity K = Yσ√c at K = KIc', tag: 're-derived' },
  run: (given) => ({
    c: flawSizeMm({
      toughnessMPaRootM: numberGiven(given, 'KIc'),
      shapeFactor: numberGiven(given, 'Y'),
      stressMPa: numberGiven(given, 'stress'),
    }),
  }),
  cautions: () => [],
};
