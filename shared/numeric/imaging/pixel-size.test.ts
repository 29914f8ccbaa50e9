import { describe, expect, it } from 'vitest';
import { pixelSizeFromScaleBar } from './pixel-size.ts';

const readings = { lengthsPx: [399, 401], knownLengthUm: 200, knownLengthStandardUncertaintyUm: 0 };

describe('the pixel size from a scale bar', () => {
  it('is the known length over the mean reading: 200 µm / 400 px', () => {
    expect(pixelSizeFromScaleBar(readings).pixelSizeUm).toBeCloseTo(0.5, 12);
  });

  it('joins repeats and line ends: √(1² + 2 × 0.25/3) / 400 of it', () => {
    const { standardUncertaintyUm, parts } = pixelSizeFromScaleBar(readings);
    // s = √2 px for 399 and 401, so s/√2 = 1 px
    expect(parts.repeats).toBeCloseTo(1 / 400, 12);
    expect(standardUncertaintyUm).toBeCloseTo((0.5 * Math.sqrt(1 + 0.5 / 3)) / 400, 12);
  });

  it('adds the uncertainty of the bar itself', () => {
    const { parts } = pixelSizeFromScaleBar({ ...readings, knownLengthStandardUncertaintyUm: 1 });
    expect(parts.bar).toBeCloseTo(0.005, 12);
  });

  it('keeps the half-spread, which for two readings is the part from repeats', () => {
    const { halfSpreadPx, relativeSpread, parts, meanLengthPx } = pixelSizeFromScaleBar(readings);
    expect(halfSpreadPx).toBe(1);
    expect(relativeSpread).toBeCloseTo(2 / 400, 12);
    expect(parts.repeats * meanLengthPx).toBeCloseTo(halfSpreadPx, 12);
  });

  it('is surer with more readings of the same scatter, down to the line ends', () => {
    const four = pixelSizeFromScaleBar({ ...readings, lengthsPx: [399, 401, 399, 401] });
    const two = pixelSizeFromScaleBar(readings);
    expect(four.parts.repeats).toBeLessThan(two.parts.repeats);
    expect(four.parts.ends).toBe(two.parts.ends);
  });

  it.each([
    [{ lengthsPx: [400] }, 'too-few-points', 'lengthsPx'],
    [{ lengthsPx: [] }, 'too-few-points', 'lengthsPx'],
    [{ lengthsPx: [400, Number.NaN] }, 'non-finite-input', 'lengthsPx'],
    [{ lengthsPx: [400, 0] }, 'non-positive-dimension', 'lengthsPx'],
    [{ knownLengthUm: 0 }, 'non-positive-dimension', 'knownLengthUm'],
    [{ knownLengthUm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'knownLengthUm'],
    [{ knownLengthStandardUncertaintyUm: -1 }, 'negative-uncertainty', 'knownLengthStandardUncertaintyUm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => pixelSizeFromScaleBar({ ...readings, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
