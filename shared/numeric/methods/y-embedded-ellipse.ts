import { embeddedEllipse } from '../fracture/shape-factors/embedded-ellipse.ts';
import { crackInputs } from './crack-inputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const yEmbeddedEllipse: Method = {
  id: 'Y.embedded.ellipse',
  version: 1,
  line: 'supporting',
  title: 'Shape factor of an elliptical flaw inside',
  inputs: [crackInputs.minorHalfAxis, crackInputs.majorHalfAxis],
  outputs: [
    { name: 'Yminor', label: 'Shape factor at the end of the minor axis', symbol: 'Y', unit: '1' },
    { name: 'Ymajor', label: 'Shape factor at the end of the major axis', symbol: 'Y', unit: '1' },
    { name: 'Ymax', label: 'Largest shape factor', symbol: 'Ymax', unit: '1' },
  ],
  mainOutput: 'Ymax',
  formula: { symbols: '√π / E(k), k² = 1 − (a/c)²', template: () => '√π / E(k), k² = 1 − ({a#} / {c#})²' },
  source: { text: 'Irwin 1962, checked for the circle by the penny weight function', tag: 'from memory' },
  run: (given) => {
    const { minorEndFactor, majorEndFactor } = embeddedEllipse({
      minorHalfAxisMm: numberGiven(given, 'a'),
      majorHalfAxisMm: numberGiven(given, 'c'),
    });
    return { Yminor: minorEndFactor, Ymajor: majorEndFactor, Ymax: minorEndFactor };
  },
  cautions: () => [],
};
