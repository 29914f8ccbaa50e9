import type { GivenInputs, Method } from '../numeric/methods/method.ts';
import { numberGiven } from '../numeric/methods/given.ts';
import { formatNumber, unitText } from './quantity.ts';

const noBreakSpace = '\u00A0';
const mmPerMetre = 1000;
// As many figures as any reading has.
const enough = { atMostFigures: 6 };

export type FormulaNumbers = {
  readonly given: GivenInputs;
  /** Numbers as typed, in our units, where their digits matter: { depth: '3.00' }. */
  readonly typed?: Readonly<Record<string, string>>;
  /** What stands after the equals sign; left out when absent. */
  readonly result?: string;
};

/**
 * The formula of a method with the numbers in it, as plain text.
 * @example formulaWithNumbers(bend4Rect, …) // "3 × 421 N × (40 − 20) mm / (2 × 4.01 mm × (3.00 mm)²) = 350.0 MPa"
 */
export function formulaWithNumbers(method: Method, numbers: FormulaNumbers): string {
  const { given, typed = {}, result } = numbers;
  const filled = method.formula.template(given).replace(/\{(\w+)(#|@m)?\}/g, (_whole, name: string, how?: string) => {
    if (how === '@m') return withUnit(formatNumber(numberGiven(given, name) / mmPerMetre, enough), 'm');
    const number = typed[name] ?? formatNumber(numberGiven(given, name), enough);
    return how === '#' ? number : withUnit(number, unitOf(method, name));
  });
  return result === undefined ? filled : `${filled} = ${result}`;
}

function unitOf(method: Method, name: string): string {
  const input = method.inputs.find((each) => each.name === name);
  return input && input.kind !== 'code' ? unitText(input.unit) : '';
}

function withUnit(number: string, unit: string): string {
  return unit === '' ? number : `${number}${noBreakSpace}${unit}`;
}
