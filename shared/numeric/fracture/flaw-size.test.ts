import { describe, expect, it } from 'vitest';
import { flawSizeMm } from './flaw-size.ts';
import { flawStressMPa } from './flaw-stress.ts';
import { surfaceFlawSizeInBending } from './surface-flaw-size-bending.ts';
import { surfaceCrackFront } from './shape-factors/surface-crack-front.ts';

const flaw = { toughnessMPaRootM: 3.5, shapeFactor: 1.25, stressMPa: 350 };
const bent = { toughnessMPaRootM: 3.5, stressMPa: 350, depthOverHalfLength: 1, thicknessMm: 3, halfWidthMm: 2 };

describe('the size of the flaw at a stress', () => {
  it('is (KIc/(Yσ))², in mm: (3.5 / 437.5)² = 6.4e-5 m = 0.064', () => {
    expect(flawSizeMm(flaw)).toBeCloseTo(0.064, 12);
  });

  it('is the inverse of the stress of a flaw', () => {
    const stressMPa = flawStressMPa({ ...flaw, flawSizeMm: 0.0784 });
    expect(flawSizeMm({ ...flaw, stressMPa })).toBeCloseTo(0.0784, 12);
  });

  it('is a quarter at twice the stress', () => {
    expect(flawSizeMm({ ...flaw, stressMPa: 700 })).toBeCloseTo(0.016, 12);
  });

  it.each([
    [{ shapeFactor: Number.NaN }, 'non-finite-input', 'shapeFactor'],
    [{ stressMPa: 0 }, 'non-positive-stress', 'stressMPa'],
    [{ toughnessMPaRootM: -1 }, 'non-positive-toughness', 'toughnessMPaRootM'],
    [{ shapeFactor: 0 }, 'non-positive-shape-factor', 'shapeFactor'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => flawSizeMm({ ...flaw, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the depth of the surface flaw in a bent bar', () => {
  it.each([0.1, 0.2, 0.5, 1, 1.5, 2])('at a/c = %d gives the toughness back with its own shape factor', (shape) => {
    const { depthMm, shapeFactor } = surfaceFlawSizeInBending({ ...bent, depthOverHalfLength: shape });
    expect(shapeFactor * 350 * Math.sqrt(depthMm / 1000)).toBeCloseTo(3.5, 10);
    const crack = { flawDepthMm: depthMm, flawHalfLengthMm: depthMm / shape, thicknessMm: 3, halfWidthMm: 2 };
    expect(surfaceCrackFront({ ...crack, mode: 'bending' }).largestFactor).toBeCloseTo(shapeFactor, 10);
  });

  it('is that of the plain formula in a section without end', () => {
    const { depthMm, shapeFactor } = surfaceFlawSizeInBending({ ...bent, thicknessMm: 1e5, halfWidthMm: undefined });
    expect(depthMm).toBeCloseTo(flawSizeMm({ ...flaw, shapeFactor }), 9);
    expect(shapeFactor).toBeCloseTo(1.2918, 4);
  });

  it('grows as the stress falls', () => {
    const depths = [600, 350, 200, 150].map((stressMPa) => surfaceFlawSizeInBending({ ...bent, stressMPa }).depthMm);
    expect(depths).toEqual([...depths].sort((one, other) => one - other));
  });

  it.each([
    [{ toughnessMPaRootM: Number.NaN }, 'non-finite-input', 'toughnessMPaRootM'],
    [{ thicknessMm: 0 }, 'non-positive-dimension', 'thicknessMm'],
    [{ halfWidthMm: 0 }, 'non-positive-dimension', 'halfWidthMm'],
    [{ stressMPa: -1 }, 'non-positive-stress', 'stressMPa'],
    [{ toughnessMPaRootM: 0 }, 'non-positive-toughness', 'toughnessMPaRootM'],
    [{ depthOverHalfLength: 0 }, 'outside-validity-range', 'depthOverHalfLength'],
    [{ depthOverHalfLength: 2.01 }, 'outside-validity-range', 'depthOverHalfLength'],
    // no flaw within the section is large enough
    [{ stressMPa: 20 }, 'outside-validity-range', 'stressMPa'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => surfaceFlawSizeInBending({ ...bent, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
