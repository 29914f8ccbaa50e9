import type { Estimated } from '../numeric/uncertainty/estimated.ts';
import type { OurUnit } from '../numeric/units/our-units.ts';
import type { QuantityRead } from '../numeric/units/parse-quantity.ts';

const noBreakSpace = '\u00A0';
const thousandsSpace = '\u202F';
const trueMinus = '\u2212';
// Four figures up to 9999 read well without a gap.
const firstSpacedNumber = 10_000;
// U = k u with k = 2, about 95 %.
export const coverageFactor = 2;
const umPerMm = 1000;

/** How many digits: fixed decimals, or figures that all count, or at most so many with trailing zeros dropped. */
export type NumberStyle = {
  readonly decimals?: number;
  readonly significantFigures?: number;
  readonly atMostFigures?: number;
};

/** A value ± U in parts, for a page that sets each in its own ink. */
export type EstimatedParts = { readonly value: string; readonly plusMinus: string; readonly unit: string };

/**
 * A value ± U (k = 2) in parts. U to two significant figures and the value to the same place, or both to `decimals`.
 * Halves are rounded away from zero.
 */
export function estimatedParts(estimated: Estimated, style: { decimals?: number } = {}): EstimatedParts {
  const expanded = coverageFactor * estimated.standardUncertainty;
  const decimals = style.decimals ?? decimalsFor(expanded, 2);
  const value = formatNumber(estimated.value, { decimals });
  return { value, plusMinus: formatNumber(expanded, { decimals }), unit: unitText(estimated.unit) };
}

/**
 * A value with its interval, the only way an estimate becomes text: "350 ± 14 MPa", never broken over lines.
 * @example formatEstimated({ value: 349.96, standardUncertainty: 7, unit: 'MPa' }, { decimals: 1 }) // "350.0 ± 14.0 MPa"
 */
export function formatEstimated(estimated: Estimated, style: { decimals?: number } = {}): string {
  const { value, plusMinus, unit } = estimatedParts(estimated, style);
  return joined(`${value}${noBreakSpace}±${noBreakSpace}${plusMinus}`, unit);
}

/** A measured or entered quantity with its unit; lengths below 1 mm in µm. Not for estimates. */
export function formatQuantity(
  quantity: { readonly value: number; readonly unit: OurUnit },
  style: NumberStyle = {},
): string {
  const { value, unit } = quantity;
  if (unit === 'mm') return formatLength(value, style);
  return joined(formatNumber(value, style), unitText(unit));
}

/** A length in mm, or in µm where it is shorter than 1 mm: "560 µm", "2.997 mm". */
export function formatLength(lengthMm: number, style: NumberStyle = {}): string {
  const short = lengthMm !== 0 && Math.abs(lengthMm) < 1;
  return joined(formatNumber(short ? lengthMm * umPerMm : lengthMm, style), short ? 'µm' : 'mm');
}

/**
 * A number with true minus and a narrow space at the thousands from 10 000. At most four significant figures,
 * whole numbers kept whole, unless told otherwise.
 */
export function formatNumber(value: number, style: NumberStyle = {}): string {
  const digits = digitsIn(style, Math.abs(value));
  const [whole = '', fraction] = digits.split('.');
  const spaced = Number(whole) >= firstSpacedNumber ? whole.replace(/\B(?=(\d{3})+$)/g, thousandsSpace) : whole;
  const sign = value < 0 && Number(digits) !== 0 ? trueMinus : '';
  return `${sign}${fraction === undefined ? spaced : `${spaced}.${fraction}`}`;
}

/** What a typed quantity was taken for: "0.118 in reads 2.997 mm". */
export function echoQuantity(read: QuantityRead): string {
  return `${read.typed.text.trim()} reads ${formatQuantity(read)}`;
}

/** The unit as shown; the ½ is raised by the page. */
export function unitText(unit: OurUnit): string {
  if (unit === '1') return '';
  if (unit === '√m') return 'm½';
  return unit === 'MPa√m' ? `MPa${noBreakSpace}m½` : unit;
}

function joined(number: string, unit: string): string {
  return unit === '' ? number : `${number}${noBreakSpace}${unit}`;
}

function digitsIn(style: NumberStyle, value: number): string {
  if (style.decimals !== undefined) return roundedDigits(value, style.decimals);
  if (style.significantFigures !== undefined) return roundedDigits(value, decimalsFor(value, style.significantFigures));
  return withoutZeros(roundedDigits(value, Math.max(0, decimalsFor(value, style.atMostFigures ?? 4))));
}

/** Decimals that leave so many significant figures after rounding; negative where tens or hundreds are rounded. */
function decimalsFor(value: number, significantFigures: number): number {
  if (value === 0 || !Number.isFinite(value)) return 0;
  const [, power = '0'] = value.toExponential(significantFigures - 1).split('e');
  return significantFigures - 1 - Number(power);
}

/** Decimal digits of a number ≥ 0, halves away from zero as the shortest decimal form of the number shows them. */
function roundedDigits(value: number, decimals: number): string {
  const [mantissa = '0', power = '0'] = value.toExponential().split('e');
  const scaled = Math.round(Number(`${mantissa}e${Number(power) + decimals}`));
  return Number(`${scaled}e${-decimals}`).toFixed(Math.max(0, decimals));
}

function withoutZeros(digits: string): string {
  return digits.includes('.') ? digits.replace(/0+$/, '').replace(/\.$/, '') : digits;
}
