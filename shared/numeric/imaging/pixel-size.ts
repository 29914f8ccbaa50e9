import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';

// An end of a drawn line falls anywhere within half a pixel of where it was set.
const endHalfWidthPx = 0.5;
const endsPerReading = 2;

export type ScaleBarReadings = {
  /** Length of the bar in each reading, image px, n ≥ 2 values > 0, any order. */
  readonly lengthsPx: readonly number[];
  /** What the bar stands for, µm, > 0. */
  readonly knownLengthUm: number;
  /** Its standard uncertainty, µm, ≥ 0. */
  readonly knownLengthStandardUncertaintyUm: number;
};

export type PixelSize = {
  /** µm per image pixel, > 0. */
  readonly pixelSizeUm: number;
  /** Standard uncertainty of the pixel size, µm. */
  readonly standardUncertaintyUm: number;
  readonly meanLengthPx: number;
  /** Largest less smallest reading over their mean, dimensionless. */
  readonly relativeSpread: number;
  /** Half of largest less smallest reading, px; with two readings it equals the part from repeats. */
  readonly halfSpreadPx: number;
  /** Relative parts of the uncertainty, dimensionless: repeats (s/√n), ends of the lines, the bar itself. */
  readonly parts: { readonly repeats: number; readonly ends: number; readonly bar: number };
};

/**
 * Size of a pixel from readings along a scale bar.
 *
 * Holds for a flat, square-on image whose scale is the same all over. Repeats count as type A; both ends of the line add
 * ± 0.5 px each, rectangular, not lessened by repeats, since a hand tends to round the same way.
 * Source: p = known / mean; u² relative = (s/√n)² + 2 (0.5/√3)² over the mean², plus the bar's own.
 * @throws OutsideDomain, the first that applies: too-few-points, non-finite-input, non-positive-dimension, negative-uncertainty
 * @example pixelSizeFromScaleBar({ lengthsPx: [400, 402], knownLengthUm: 200.5, knownLengthStandardUncertaintyUm: 0.5 }).pixelSizeUm // 0.5
 */
export function pixelSizeFromScaleBar(readings: ScaleBarReadings): PixelSize {
  const { lengthsPx, knownLengthUm, knownLengthStandardUncertaintyUm } = readings;
  requireThat(lengthsPx.length >= 2, 'too-few-points', 'lengthsPx');
  for (const lengthPx of lengthsPx) requireFinite({ lengthsPx: lengthPx });
  requireFinite({ knownLengthUm, knownLengthStandardUncertaintyUm });
  for (const lengthPx of lengthsPx) requirePositive({ lengthsPx: lengthPx }, 'non-positive-dimension');
  requirePositive({ knownLengthUm }, 'non-positive-dimension');
  requireNotNegative({ knownLengthStandardUncertaintyUm }, 'negative-uncertainty');
  const count = lengthsPx.length;
  const meanLengthPx = lengthsPx.reduce((sum, lengthPx) => sum + lengthPx, 0) / count;
  const squares = lengthsPx.reduce((sum, lengthPx) => sum + (lengthPx - meanLengthPx) ** 2, 0);
  const spreadPx = Math.max(...lengthsPx) - Math.min(...lengthsPx);
  const parts = {
    repeats: Math.sqrt(squares / (count - 1) / count) / meanLengthPx,
    ends: (Math.sqrt(endsPerReading) * endHalfWidthPx) / Math.sqrt(3) / meanLengthPx,
    bar: knownLengthStandardUncertaintyUm / knownLengthUm,
  };
  const pixelSizeUm = knownLengthUm / meanLengthPx;
  return {
    pixelSizeUm,
    standardUncertaintyUm: pixelSizeUm * Math.hypot(parts.repeats, parts.ends, parts.bar),
    meanLengthPx,
    relativeSpread: spreadPx / meanLengthPx,
    halfSpreadPx: spreadPx / 2,
    parts,
  };
}
