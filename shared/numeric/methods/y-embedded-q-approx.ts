import { flawShapeParameters } from '../fracture/shape-factors/flaw-shape-parameters.ts';
import { crackInputs } from './crack-inputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const yEmbeddedQApprox: Method = {
  id: 'Y.embedded.Qapprox',
  version: 1,
  line: 'supporting',
  title: 'Flaw shape parameter of an ellipse',
  inputs: [crackInputs.minorOverMajor],
  outputs: [
    { name: 'Qapprox', label: 'Approximate shape parameter', symbol: 'Q', unit: '1' },
    { name: 'Qexact', label: 'Exact shape parameter', symbol: 'E(k)²', unit: '1' },
  ],
  mainOutput: 'Qapprox',
  formula: { symbols: '1 + 1.464 (a/c)^1.65', template: () => '1 + 1.464 × ({aOverC})^1.65' },
  source: { text: 'Newman and Raju 1981; √Q within 0.07 % of E(k), scanned', tag: 'looked up' },
  run: (given) => {
    const { approximate, exact } = flawShapeParameters({ minorOverMajor: numberGiven(given, 'aOverC') });
    return { Qapprox: approximate, Qexact: exact };
  },
  cautions: () => [],
};
