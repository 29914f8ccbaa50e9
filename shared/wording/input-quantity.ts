import type { OurUnit } from '../numeric/units/our-units.ts';
import { coverageFactor, estimatedParts, formatNumber, type EstimatedParts } from './quantity.ts';

const noBreakSpace = '\u00A0';
const umPerMm = 1000;

export type MeasuredInput = {
  readonly value: number;
  /** In the unit of the value, ≥ 0; 0 for an input that is exact. */
  readonly standardUncertainty: number;
  readonly unit: OurUnit;
};

/** An input in parts: lengths under 1 mm in µm, U (k = 2) to two figures; no ± where the input is exact. */
export function inputParts(input: MeasuredInput): Omit<EstimatedParts, 'plusMinus'> & { plusMinus: string | null } {
  const inUm = input.unit === 'mm' && input.value !== 0 && Math.abs(input.value) < 1;
  const scale = inUm ? umPerMm : 1;
  const value = input.value * scale;
  const standardUncertainty = input.standardUncertainty * scale;
  const parts = estimatedParts({ value, standardUncertainty, unit: input.unit }, decimalsFor(standardUncertainty));
  const unit = inUm ? 'µm' : parts.unit;
  return standardUncertainty === 0 ? { value: formatNumber(value), plusMinus: null, unit } : { ...parts, unit };
}

/** An input as text: "291 ± 16 µm". */
export function inputText(input: MeasuredInput): string {
  const { value, plusMinus, unit } = inputParts(input);
  const number = plusMinus === null ? value : `${value}${noBreakSpace}±${noBreakSpace}${plusMinus}`;
  return unit === '' ? number : `${number}${noBreakSpace}${unit}`;
}

/** No decimals below the tens of a large U, so that 560 ± 67 does not read 560 ± 70. */
function decimalsFor(standardUncertainty: number): { decimals?: number } {
  return coverageFactor * standardUncertainty >= 100 ? { decimals: 0 } : {};
}
