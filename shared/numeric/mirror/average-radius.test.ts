import { describe, expect, it } from 'vitest';
import { averageEllipseRadius } from './average-ellipse-radius.ts';
import { averageSurfaceRadiusMm } from './average-surface-radius.ts';

describe('the radius of a mirror at the surface', () => {
  it('is half of the full width: (0.412 + 0.436)/2', () => {
    expect(averageSurfaceRadiusMm({ leftRadiusMm: 0.412, rightRadiusMm: 0.436 })).toBeCloseTo(0.424, 12);
  });

  it.each([
    [{ leftRadiusMm: 0 }, 'non-positive-mirror-radius', 'leftRadiusMm'],
    [{ rightRadiusMm: -0.1 }, 'non-positive-mirror-radius', 'rightRadiusMm'],
    [{ rightRadiusMm: Number.NaN }, 'non-finite-input', 'rightRadiusMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const read = () => averageSurfaceRadiusMm({ leftRadiusMm: 0.4, rightRadiusMm: 0.4, ...wrong });
    expect(read).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the radius of an elliptical mirror', () => {
  it('is the root of the product, beside the mean: √(0.2 × 0.45) = 0.3', () => {
    const { geometricMeanMm, arithmeticMeanMm } = averageEllipseRadius({ radius1Mm: 0.2, radius2Mm: 0.45 });
    expect(geometricMeanMm).toBeCloseTo(0.3, 12);
    expect(arithmeticMeanMm).toBeCloseTo(0.325, 12);
  });

  it('is one radius for a circle, whichever way it is taken', () => {
    const { geometricMeanMm, arithmeticMeanMm } = averageEllipseRadius({ radius1Mm: 0.3, radius2Mm: 0.3 });
    expect(geometricMeanMm).toBeCloseTo(arithmeticMeanMm, 12);
  });

  it.each([
    [{ radius1Mm: 0 }, 'non-positive-mirror-radius', 'radius1Mm'],
    [{ radius2Mm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'radius2Mm'],
  ])('is refused for %o', (wrong, code, field) => {
    const read = () => averageEllipseRadius({ radius1Mm: 0.3, radius2Mm: 0.3, ...wrong });
    expect(read).toThrow(expect.objectContaining({ code, field }));
  });
});
