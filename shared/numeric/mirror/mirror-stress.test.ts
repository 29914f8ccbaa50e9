import { describe, expect, it } from 'vitest';
import { mirrorStressMPa } from './mirror-stress.ts';

const mirror = { mirrorConstantMPaRootM: 2, radiusMm: 0.25 };

describe('the stress from a mirror radius', () => {
  it('is A/√R with R in metres: 2 / √0.00025 = 2 / 0.0158114', () => {
    expect(mirrorStressMPa(mirror)).toBeCloseTo(2 / 0.015811388300841896, 9);
  });

  it('halves when the mirror is four times as large', () => {
    expect(mirrorStressMPa({ ...mirror, radiusMm: 1 })).toBeCloseTo(mirrorStressMPa(mirror) / 2, 9);
  });

  it.each([
    [{ radiusMm: Number.NaN }, 'non-finite-input', 'radiusMm'],
    [{ mirrorConstantMPaRootM: Number.POSITIVE_INFINITY }, 'non-finite-input', 'mirrorConstantMPaRootM'],
    [{ radiusMm: 0 }, 'non-positive-mirror-radius', 'radiusMm'],
    [{ radiusMm: -1 }, 'non-positive-mirror-radius', 'radiusMm'],
    [{ mirrorConstantMPaRootM: 0 }, 'non-positive-mirror-constant', 'mirrorConstantMPaRootM'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => mirrorStressMPa({ ...mirror, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
