import { describe, expect, it } from 'vitest';
import { threePointLocalStress } from './three-point-local-stress.ts';

const bar = { loadN: 612.5, outerSpanMm: 40, widthMm: 4, depthMm: 3, xMm: -3.2, yMm: 0.15 };

describe('the stress at an origin in a three-point bar', () => {
  it('is the nominal stress times both ratios: 1020.83 × (1 − 6.4/40) × (1 − 0.3/3) = 771.75', () => {
    const stress = threePointLocalStress(bar);
    expect(stress.momentRatio).toBeCloseTo(0.84, 12);
    expect(stress.depthRatio).toBeCloseTo(0.9, 12);
    expect(stress.localStressMPa).toBeCloseTo(771.75, 9);
  });

  it('is the same on either side of mid-span', () => {
    expect(threePointLocalStress({ ...bar, xMm: 3.2 })).toEqual(threePointLocalStress(bar));
  });

  it('is nothing half way down, and the nominal stress in compression on the far face', () => {
    expect(threePointLocalStress({ ...bar, yMm: 1.5 }).localStressMPa).toBeCloseTo(0, 12);
    const far = threePointLocalStress({ ...bar, xMm: 0, yMm: 3 });
    expect(far.localStressMPa).toBeCloseTo(-far.nominalStressMPa, 9);
  });

  it.each([
    [{ xMm: Number.NaN }, 'non-finite-input', 'xMm'],
    [{ yMm: 3.01 }, 'depth-outside-section', 'yMm'],
    [{ yMm: -0.01 }, 'depth-outside-section', 'yMm'],
    [{ xMm: 20.01 }, 'position-outside-span', 'xMm'],
    [{ xMm: -20.01 }, 'position-outside-span', 'xMm'],
    [{ loadN: -1, yMm: 9 }, 'negative-load', 'loadN'],
    [{ yMm: 9, xMm: 90 }, 'depth-outside-section', 'yMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => threePointLocalStress({ ...bar, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
