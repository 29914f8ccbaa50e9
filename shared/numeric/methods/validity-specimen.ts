import { standardSpecimen } from '../bending/standard-specimen.ts';
import { checkInputs } from './check-inputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
});

export const validitySpecimen: Method = {
  id: 'validity.specimen',
  version: 1,
  line: 'supporting',
  title: 'Which standard bar this is',
  inputs: [checkInputs.width, checkInputs.depth, checkInputs.outerSpan, checkInputs.innerSpan],
  outputs: [
    { name: 'c1161Size', label: 'Size in ASTM C1161', symbol: '', unit: null },
    { name: 'iso14704Span30', label: 'Short-span bar of ISO 14704', symbol: '', unit: null },
    { name: 'en843_1', label: 'Size in EN 843-1', symbol: '', unit: null },
  ],
  formula: {
    symbols: 'section and spans against the tables',
    template: () => '{depth} × {width} on {outerSpan} / {innerSpan}',
  },
  source: {
    text: 'ASTM C1161-13 and EN 843-1:2006 (scopes); section tolerances and the inner spans from memory',
    tag: 'from memory',
  },
  run: (given) => {
    const { c1161Size, iso14704Span30, en843Size } = standardSpecimen(bar(given));
    return { c1161Size, iso14704Span30, en843_1: en843Size };
  },
  cautions: () => [],
};
