import { describe, expect, it } from 'vitest';
import { threePointBendingStressMPa } from './three-point-bending-stress.ts';

const bar = { loadN: 612.5, outerSpanMm: 40, widthMm: 4, depthMm: 3 };

describe('the stress at mid-span of a three-point bar', () => {
  it('is 3FL/2bd²: 3 × 612.5 × 40 / (2 × 4 × 9) = 73 500 / 72', () => {
    expect(threePointBendingStressMPa(bar)).toBeCloseTo(73_500 / 72, 9);
  });

  it('doubles with the load and falls fourfold with a doubled depth', () => {
    const stress = threePointBendingStressMPa(bar);
    expect(threePointBendingStressMPa({ ...bar, loadN: 1225 })).toBeCloseTo(2 * stress, 9);
    expect(threePointBendingStressMPa({ ...bar, depthMm: 6 })).toBeCloseTo(stress / 4, 9);
  });

  it('is zero without a load', () => {
    expect(threePointBendingStressMPa({ ...bar, loadN: 0 })).toBe(0);
  });

  it.each([
    [{ loadN: Number.NaN }, 'non-finite-input', 'loadN'],
    [{ outerSpanMm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'outerSpanMm'],
    [{ widthMm: 0 }, 'non-positive-dimension', 'widthMm'],
    [{ depthMm: -3 }, 'non-positive-dimension', 'depthMm'],
    [{ outerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
    [{ loadN: -1 }, 'negative-load', 'loadN'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => threePointBendingStressMPa({ ...bar, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });

  it('names a wrong section before a wrong span, and a wrong span before a wrong load', () => {
    const all = { loadN: -1, outerSpanMm: 0, widthMm: 4, depthMm: 0 };
    expect(() => threePointBendingStressMPa(all)).toThrow(expect.objectContaining({ code: 'non-positive-dimension' }));
    expect(() => threePointBendingStressMPa({ ...all, depthMm: 3 })).toThrow(
      expect.objectContaining({ code: 'non-positive-span' }),
    );
  });
});
