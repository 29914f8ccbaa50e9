import type { LengthReading, MarkReading } from '../rules/mark-readings.ts';
import { formatEstimated, formatNumber } from './quantity.ts';

const noBreakSpace = '\u00a0';

/** What stands before the value, so that a reading is known without its column's head. */
const signOf: Record<LengthReading['quantity'], string> = {
  'mirror radius': 'R ',
  'flaw half-axis, depth': 'depth ',
  'flaw half-axis, along': 'along ',
  'depth of origin': 'origin at ',
  length: '',
};

/**
 * A reading as text, ± at k = 2: "R 291 ± 16 µm". An image without a scale yields no length: "R 412 px, uncalibrated".
 */
export function readingText(reading: MarkReading): string {
  if (reading.quantity === 'hackle direction') return `${formatNumber(reading.directionDeg, { decimals: 0 })}°`;
  return `${signOf[reading.quantity]}${lengthText(reading)}`;
}

/** The value alone. */
export function lengthText(reading: LengthReading): string {
  const { valuePx, valueMm, standardUncertaintyMm } = reading;
  if (valueMm === null || standardUncertaintyMm === null) {
    return `${formatNumber(valuePx, { decimals: 0 })}${noBreakSpace}px, uncalibrated`;
  }
  if (valueMm < 1) return inUm(valueMm, standardUncertaintyMm);
  return formatEstimated({ value: valueMm, standardUncertainty: standardUncertaintyMm, unit: 'mm' });
}

/** U to two significant figures, the value to the same decimals; U below a tenth of a µm says nothing more. */
function inUm(valueMm: number, standardUncertaintyMm: number): string {
  const expandedUm = 2 * standardUncertaintyMm * 1000;
  const decimals = expandedUm >= 10 ? 0 : expandedUm >= 1 ? 1 : 2;
  const value = formatNumber(valueMm * 1000, { decimals });
  return `${value}${noBreakSpace}±${noBreakSpace}${formatNumber(expandedUm, { decimals })}${noBreakSpace}µm`;
}
