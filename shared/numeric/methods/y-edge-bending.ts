import { edgeCrackBending } from '../fracture/shape-factors/edge-crack-bending.ts';
import { crackInputs } from './crack-inputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const yEdgeBending: Method = {
  id: 'Y.edge.bending',
  version: 1,
  line: 'supporting',
  title: 'Shape factor of a straight edge crack in bending',
  inputs: [crackInputs.depthOverSection],
  outputs: [{ name: 'Y', label: 'Shape factor', symbol: 'Y', unit: '1' }],
  mainOutput: 'Y',
  formula: {
    symbols: '1.99 − 2.47α + 12.97α² − 23.17α³ + 24.80α⁴, α = a/W',
    template: () => '1.99 − 2.47 × {aOverW} + 12.97 × {aOverW}² − 23.17 × {aOverW}³ + 24.80 × {aOverW}⁴',
  },
  source: {
    text: 'Brown and Srawley, ASTM STP 410 (1966), pure bending, a/W ≤ 0.6; within 0.2 % of Tada’s form',
    tag: 'from memory',
  },
  run: (given) => ({ Y: edgeCrackBending({ depthOverSection: numberGiven(given, 'aOverW') }) }),
  cautions: () => [],
};
