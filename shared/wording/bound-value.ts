import type { ValueFormat, ValueParts } from '../contracts/findings.ts';
import { coverageFactor, estimatedParts } from './quantity.ts';

const noBreakSpace = '\u00A0';
const umPerMm = 1000;
// A U of three figures or more is written whole, so that 560 ± 67 never reads 560 ± 70.
const wholeFrom = 100;

export type ValueOfSource = {
  readonly value: number;
  /** In the unit of the value, > 0: nothing is bound without its interval. */
  readonly standardUncertainty: number;
  /** mm, MPa, MPa√m, GPa or 1. */
  readonly unit: string;
};

/** A value as it stands in a sentence: lengths under 1 mm in µm, U (k = 2) to two figures unless told otherwise. */
export function boundParts(source: ValueOfSource, format: ValueFormat): ValueParts {
  const inUm = source.unit === 'mm' && source.value !== 0 && Math.abs(source.value) < 1;
  const scale = inUm ? umPerMm : 1;
  const value = source.value * scale;
  const standardUncertainty = source.standardUncertainty * scale;
  const decimals = decimalsOf(coverageFactor * standardUncertainty, format);
  const parts = estimatedParts({ value, standardUncertainty, unit: '1' }, { decimals });
  return { ...parts, unit: inUm ? 'µm' : unitWord(source.unit) };
}

/** "369 ± 27 MPa", never broken over lines. */
export function boundText({ value, plusMinus, unit }: ValueParts): string {
  const number = `${value}${noBreakSpace}±${noBreakSpace}${plusMinus}`;
  return unit === '' ? number : `${number}${noBreakSpace}${unit}`;
}

function decimalsOf(expanded: number, { decimals, significant }: ValueFormat): number {
  if (decimals !== null) return decimals;
  if (significant === null && expanded >= wholeFrom) return 0;
  if (expanded === 0) return 0;
  return Math.max(0, (significant ?? 2) - 1 - Math.floor(Math.log10(expanded)));
}

function unitWord(unit: string): string {
  if (unit === '1') return '';
  return unit === 'MPa√m' ? `MPa${noBreakSpace}m½` : unit;
}
