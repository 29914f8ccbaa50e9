import { describe, expect, it } from 'vitest';
import { residualStressMPa } from './residual-stress.ts';

const mirror = { mirrorConstantMPaRootM: 2, radiusMm: 0.4, appliedStressMPa: 140 };

describe('the residual stress from a mirror', () => {
  it('is what the mirror says less what was applied: 2/√0.0004 = 100, less 140', () => {
    expect(residualStressMPa(mirror)).toBeCloseTo(-40, 10);
  });

  it('is tension where the mirror is smaller than the load can explain', () => {
    expect(residualStressMPa({ ...mirror, radiusMm: 0.1 })).toBeCloseTo(60, 10);
  });

  it('is the whole mirror stress where nothing was applied', () => {
    expect(residualStressMPa({ ...mirror, appliedStressMPa: 0 })).toBeCloseTo(100, 10);
  });

  it.each([
    [{ appliedStressMPa: Number.NaN }, 'non-finite-input', 'appliedStressMPa'],
    [{ radiusMm: 0 }, 'non-positive-mirror-radius', 'radiusMm'],
    [{ mirrorConstantMPaRootM: -1 }, 'non-positive-mirror-constant', 'mirrorConstantMPaRootM'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => residualStressMPa({ ...mirror, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
