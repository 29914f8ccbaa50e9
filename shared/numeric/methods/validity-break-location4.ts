import { breakLocation } from '../bending/break-location.ts';
import { position4Cautions } from './bar-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method, NumberInput } from './method.ts';

const bar = (given: GivenInputs) => ({
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  xMm: numberGiven(given, 'x'),
});

// Only to tell how near a roller is against the bar.
const depth: NumberInput = { ...checkInputs.depth, optional: true };

export const validityBreakLocation4: Method = {
  id: 'validity.breakLocation4',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: where it broke',
  inputs: [checkInputs.outerSpan, checkInputs.innerSpan, checkInputs.x, depth],
  outputs: [{ name: 'location', label: 'Place of the break', symbol: '', unit: null }, checkOutputs.momentRatio],
  formula: {
    symbols: '|x| ≤ l/2 inside; up to L/2 between the rollers',
    template: () => '|{x#}| mm against {innerSpan} / 2 and {outerSpan} / 2',
  },
  source: { text: 'Trade practice; moment from beam theory', tag: 'practice' },
  run: (given) => {
    const { location, momentRatio } = breakLocation(bar(given));
    return { location, momentRatio };
  },
  cautions: position4Cautions,
};
