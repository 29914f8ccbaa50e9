import { describe, expect, it } from 'vitest';
import { embeddedCrackFront } from './embedded-crack-front.ts';
import { embeddedEllipse } from './embedded-ellipse.ts';
import { flawShapeParameters } from './flaw-shape-parameters.ts';

const ellipse = { minorHalfAxisMm: 0.03, majorHalfAxisMm: 0.06 };
const crack = { flawHalfDepthMm: 0.3, flawHalfLengthMm: 0.6, thicknessMm: 3, halfWidthMm: 2 };

describe('the shape factor of an ellipse inside', () => {
  it('of a circle is 2/√π all round', () => {
    const circle = embeddedEllipse({ minorHalfAxisMm: 0.05, majorHalfAxisMm: 0.05 });
    expect(circle.minorEndFactor).toBeCloseTo(2 / Math.sqrt(Math.PI), 14);
    expect(circle.majorEndFactor).toBeCloseTo(2 / Math.sqrt(Math.PI), 14);
  });

  it('rises to √π of the through crack as the ellipse grows long', () => {
    expect(embeddedEllipse({ ...ellipse, majorHalfAxisMm: 3e5 }).minorEndFactor).toBeCloseTo(Math.sqrt(Math.PI), 9);
  });

  it.each([
    [0.2, 1.687],
    [0.4, 1.54],
    [0.6, 1.389],
    [0.8, 1.25],
  ])('at a/c = %d is %d', (ratio, factor) => {
    expect(embeddedEllipse({ minorHalfAxisMm: ratio, majorHalfAxisMm: 1 }).minorEndFactor).toBeCloseTo(factor, 2.9);
  });

  it.each([
    [{ minorHalfAxisMm: Number.NaN }, 'non-finite-input', 'minorHalfAxisMm'],
    [{ majorHalfAxisMm: 0 }, 'non-positive-flaw-size', 'majorHalfAxisMm'],
    [{ minorHalfAxisMm: 0.061 }, 'outside-validity-range', 'minorHalfAxisMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => embeddedEllipse({ ...ellipse, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the flaw shape parameter', () => {
  it('is approximated within 0.07 % of its root', () => {
    for (let ratio = 0.01; ratio <= 1; ratio += 0.01) {
      const { approximate, exact } = flawShapeParameters({ minorOverMajor: ratio });
      expect(Math.abs(Math.sqrt(approximate / exact) - 1)).toBeLessThan(7e-4);
    }
  });

  it.each([0, -0.5, 1.01, Number.NaN])('is refused for a ratio of %d', (minorOverMajor) => {
    const refused = expect.objectContaining({ field: 'minorOverMajor' });
    expect(() => flawShapeParameters({ minorOverMajor })).toThrow(refused);
  });
});

describe('the shape factor of a crack in the middle of a plate', () => {
  it('of a thick plate is that of the ellipse alone within 0.07 %', () => {
    const front = embeddedCrackFront({ ...crack, thicknessMm: 1e5, halfWidthMm: undefined });
    const alone = embeddedEllipse({ minorHalfAxisMm: 0.3, majorHalfAxisMm: 0.6 });
    expect(Math.abs(front.secondEndFactor / alone.minorEndFactor - 1)).toBeLessThan(7e-4);
    expect(Math.abs(front.firstEndFactor / alone.majorEndFactor - 1)).toBeLessThan(7e-4);
  });

  it('grows as the plate grows thin', () => {
    expect(embeddedCrackFront({ ...crack, thicknessMm: 1 }).largestFactor).toBeGreaterThan(
      embeddedCrackFront(crack).largestFactor,
    );
  });

  it.each([
    [{ thicknessMm: Number.NaN }, 'non-finite-input', 'thicknessMm'],
    [{ halfWidthMm: -2 }, 'non-positive-dimension', 'halfWidthMm'],
    [{ flawHalfDepthMm: 0 }, 'non-positive-flaw-size', 'flawHalfDepthMm'],
    [{ thicknessMm: 0.6 }, 'flaw-deeper-than-section', 'flawHalfDepthMm'],
    [{ flawHalfDepthMm: 0.61 }, 'outside-validity-range', 'flawHalfDepthMm'],
    [{ flawHalfLengthMm: 1 }, 'outside-validity-range', 'flawHalfLengthMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => embeddedCrackFront({ ...crack, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
