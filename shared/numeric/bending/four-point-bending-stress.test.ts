import { describe, expect, it } from 'vitest';
import { fourPointBendingStressMPa } from './four-point-bending-stress.ts';
import { threePointBendingStressMPa } from './three-point-bending-stress.ts';

const bar = { loadN: 412, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3 };

describe('the stress between the inner rollers of a four-point bar', () => {
  it('is 3F(L − l)/2bd²: 3 × 412 × 20 / (2 × 4 × 9) = 24 720 / 72', () => {
    expect(fourPointBendingStressMPa(bar)).toBeCloseTo(24_720 / 72, 9);
  });

  it('is the three-point stress when the inner rollers meet', () => {
    const meeting = { ...bar, innerSpanMm: 0 };
    expect(fourPointBendingStressMPa(meeting)).toBeCloseTo(threePointBendingStressMPa(meeting), 9);
  });

  it('stays the same when load, width and all lengths along the bar grow together', () => {
    const larger = { loadN: 824, outerSpanMm: 80, innerSpanMm: 40, widthMm: 16, depthMm: 3 };
    expect(fourPointBendingStressMPa(larger)).toBeCloseTo(fourPointBendingStressMPa(bar), 9);
  });

  it.each([
    [{ innerSpanMm: Number.NaN }, 'non-finite-input', 'innerSpanMm'],
    [{ depthMm: 0, innerSpanMm: 50 }, 'non-positive-dimension', 'depthMm'],
    [{ outerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
    [{ innerSpanMm: -5 }, 'negative-inner-span', 'innerSpanMm'],
    [{ innerSpanMm: 40 }, 'inner-span-not-less-than-outer', 'innerSpanMm'],
    [{ innerSpanMm: 45 }, 'inner-span-not-less-than-outer', 'innerSpanMm'],
    [{ loadN: -10 }, 'negative-load', 'loadN'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => fourPointBendingStressMPa({ ...bar, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
