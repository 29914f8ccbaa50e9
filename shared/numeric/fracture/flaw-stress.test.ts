import { describe, expect, it } from 'vitest';
import { flawStressMPa } from './flaw-stress.ts';

const flaw = { toughnessMPaRootM: 3.5, shapeFactor: 1.25, flawSizeMm: 0.0784 };

describe('the stress from a flaw size', () => {
  it('is KIc/(Y√c) with c in metres: 3.5 / (1.25 × 0.00885438) = 316.2', () => {
    expect(flawStressMPa(flaw)).toBeCloseTo(3.5 / (1.25 * Math.sqrt(7.84e-5)), 9);
    expect(flawStressMPa(flaw)).toBeCloseTo(316.2278, 4);
  });

  it('is lower for a larger flaw', () => {
    expect(flawStressMPa({ ...flaw, flawSizeMm: 0.1 })).toBeLessThan(flawStressMPa(flaw));
  });

  it('gives back the toughness when put under the root again', () => {
    expect(flawStressMPa(flaw) * 1.25 * Math.sqrt(7.84e-5)).toBeCloseTo(3.5, 12);
  });

  it.each([
    [{ flawSizeMm: Number.NaN }, 'non-finite-input', 'flawSizeMm'],
    [{ flawSizeMm: 0 }, 'non-positive-flaw-size', 'flawSizeMm'],
    [{ toughnessMPaRootM: 0 }, 'non-positive-toughness', 'toughnessMPaRootM'],
    [{ shapeFactor: 0 }, 'non-positive-shape-factor', 'shapeFactor'],
    [{ shapeFactor: Number.NEGATIVE_INFINITY }, 'non-finite-input', 'shapeFactor'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => flawStressMPa({ ...flaw, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
