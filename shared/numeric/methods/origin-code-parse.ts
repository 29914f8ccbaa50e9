import { parseOriginCode } from '../origin/parse-origin-code.ts';
import { codeGiven } from './given.ts';
import type { Method } from './method.ts';

export const originCodeParse: Method = {
  id: 'originCode.parse',
  version: 1,
  line: 'supporting',
  title: 'Code of an origin, read',
  // no choices: any code that keeps to the grammar
  inputs: [{ kind: 'code', name: 'code', label: 'Code of the origin', choices: [] }],
  outputs: [
    { name: 'relation', label: 'How the flaws belong together', symbol: '', unit: null },
    { name: 'parts', label: 'Flaws', symbol: '', unit: null },
    { name: 'uncertainParts', label: 'Flaws that are probable, not certain', symbol: '', unit: null },
  ],
  formula: { symbols: 'X&Y, X/Y, X+Y, X?', template: () => 'read as written' },
  source: { text: 'Marks for mixed origins as in ASTM C1322', tag: 'looked up' },
  run: (given) => ({ ...parseOriginCode(codeGiven(given, 'code') ?? '') }),
  cautions: () => [],
};
