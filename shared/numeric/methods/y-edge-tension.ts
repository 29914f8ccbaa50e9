import { edgeCrackTension } from '../fracture/shape-factors/edge-crack-tension.ts';
import { crackInputs } from './crack-inputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const yEdgeTension: Method = {
  id: 'Y.edge.tension',
  version: 1,
  line: 'supporting',
  title: 'Shape factor of a straight edge crack in tension',
  inputs: [crackInputs.depthOverSection],
  outputs: [{ name: 'Y', label: 'Shape factor', symbol: 'Y', unit: '1' }],
  mainOutput: 'Y',
  formula: {
    symbols: '√π (1.12 − 0.231α + 10.55α² − 21.72α³ + 30.39α⁴), α = a/W',
    template: () => '√π × (1.12 − 0.231 × {aOverW} + 10.55 × {aOverW}² − 21.72 × {aOverW}³ + 30.39 × {aOverW}⁴)',
  },
  source: { text: 'Tada’s polynomial as quoted in public code; range a/W ≤ 0.6 from memory', tag: 'looked up' },
  run: (given) => ({ Y: edgeCrackTension({ depthOverSection: numberGiven(given, 'aOverW') }) }),
  cautions: () => [],
};
