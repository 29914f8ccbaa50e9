import { describe, expect, it } from 'vitest';
import { mirrorRadiusMm } from './mirror-radius.ts';
import { mirrorStressMPa } from './mirror-stress.ts';

const mirror = { mirrorConstantMPaRootM: 2, stressMPa: 70 };

describe('the radius of the mirror that a stress leaves', () => {
  it('is (A/σ)²: (2/70)² m = 0.000816327 m', () => {
    expect(mirrorRadiusMm(mirror)).toBeCloseTo(1000 / 35 ** 2, 12);
  });

  it('gives the stress back by the mirror relation', () => {
    const radiusMm = mirrorRadiusMm(mirror);
    expect(mirrorStressMPa({ mirrorConstantMPaRootM: 2, radiusMm })).toBeCloseTo(70, 10);
  });

  it('is a quarter at twice the stress', () => {
    expect(mirrorRadiusMm({ ...mirror, stressMPa: 140 })).toBeCloseTo(mirrorRadiusMm(mirror) / 4, 12);
  });

  it.each([
    [{ stressMPa: 0 }, 'non-positive-stress', 'stressMPa'],
    [{ stressMPa: Number.NaN }, 'non-finite-input', 'stressMPa'],
    [{ mirrorConstantMPaRootM: 0 }, 'non-positive-mirror-constant', 'mirrorConstantMPaRootM'],
    [{ mirrorConstantMPaRootM: Number.POSITIVE_INFINITY }, 'non-finite-input', 'mirrorConstantMPaRootM'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => mirrorRadiusMm({ ...mirror, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
