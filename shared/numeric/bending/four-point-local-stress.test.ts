import { describe, expect, it } from 'vitest';
import { fourPointLocalStress } from './four-point-local-stress.ts';
import { threePointLocalStress } from './three-point-local-stress.ts';

const bar = { loadN: 500, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3, xMm: 13, yMm: 0.05 };

describe('the stress at an origin in a four-point bar', () => {
  it('falls outside the inner span: 416.67 × (40 − 26)/20 × (1 − 0.1/3) = 281.94', () => {
    const stress = fourPointLocalStress(bar);
    expect(stress.momentRatio).toBeCloseTo(0.7, 12);
    expect(stress.localStressMPa).toBeCloseTo((30_000 / 72) * 0.7 * (2.9 / 3), 9);
  });

  it('is level up to the inner roller and zero at the outer one', () => {
    expect(fourPointLocalStress({ ...bar, xMm: 10, yMm: 0 }).momentRatio).toBe(1);
    expect(fourPointLocalStress({ ...bar, xMm: 10 + 1e-9, yMm: 0 }).momentRatio).toBeCloseTo(1, 9);
    expect(fourPointLocalStress({ ...bar, xMm: -20, yMm: 0 }).localStressMPa).toBe(0);
  });

  it('is the three-point stress when the inner rollers meet', () => {
    const meeting = { ...bar, innerSpanMm: 0 };
    const { localStressMPa } = threePointLocalStress(meeting);
    expect(fourPointLocalStress(meeting).localStressMPa).toBeCloseTo(localStressMPa, 9);
  });

  it.each([
    [{ yMm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'yMm'],
    [{ yMm: 3.2 }, 'depth-outside-section', 'yMm'],
    [{ yMm: -0.1 }, 'depth-outside-section', 'yMm'],
    [{ xMm: 20.5 }, 'position-outside-span', 'xMm'],
    [{ innerSpanMm: 40, yMm: 9 }, 'inner-span-not-less-than-outer', 'innerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => fourPointLocalStress({ ...bar, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
