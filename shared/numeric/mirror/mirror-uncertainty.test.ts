import { describe, expect, it } from 'vitest';
import { relativeMirrorUncertainty } from './mirror-uncertainty.ts';

const mirror = { mirrorConstantMPaRootM: 2, radiusMm: 0.25, uMirrorConstantMPaRootM: 0.06, uRadiusMm: 0.02 };

describe('the uncertainty of a mirror stress', () => {
  it('takes the radius by half: 3 % and 8 %/2 make 5 %', () => {
    expect(relativeMirrorUncertainty(mirror)).toBeCloseTo(0.05, 12);
  });

  it('is nothing where both are exact', () => {
    expect(relativeMirrorUncertainty({ ...mirror, uMirrorConstantMPaRootM: 0, uRadiusMm: 0 })).toBe(0);
  });

  it.each([
    [{ uRadiusMm: -0.01 }, 'negative-uncertainty', 'uRadiusMm'],
    [{ uMirrorConstantMPaRootM: Number.NaN }, 'non-finite-input', 'uMirrorConstantMPaRootM'],
    [{ radiusMm: 0 }, 'non-positive-mirror-radius', 'radiusMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => relativeMirrorUncertainty({ ...mirror, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
