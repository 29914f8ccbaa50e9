import { numberGiven } from './given.ts';
import type { GivenInputs } from './method.ts';

/** The arms in the formula with numbers: (L − l) between the inner rollers; outside them (L − 2|x|), where l drops out. */
export function fourPointArms(given: GivenInputs): string {
  const inside = Math.abs(numberGiven(given, 'x')) <= numberGiven(given, 'innerSpan') / 2;
  return inside ? '({outerSpan#} − {innerSpan#})' : '({outerSpan#} − 2 × |{x#}|)';
}
