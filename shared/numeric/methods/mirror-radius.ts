import { mirrorRadiusMm } from '../mirror/mirror-radius.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';
import { mirrorInputs } from './mirror-inputs.ts';

export const mirrorRadius: Method = {
  id: 'mirror.radius',
  version: 1,
  line: 'supporting',
  title: 'Mirror radius to be looked for',
  inputs: [mirrorInputs.A, mirrorInputs.stress],
  outputs: [{ name: 'R', label: 'Mirror radius', symbol: 'R', unit: 'mm' }],
  mainOutput: 'R',
  formula: { symbols: '(A / σ)²', template: () => '({A} / {stress})²' },
  source: { text: 'Mirror relation σ√R = A', tag: 'looked up' },
  run: (given) => ({
    R: mirrorRadiusMm({ mirrorConstantMPaRootM: numberGiven(given, 'A'), stressMPa: numberGiven(given, 'stress') }),
  }),
  cautions: () => [],
};
