import { describe, expect, it } from 'vitest';
import { edgeCrackBending } from './edge-crack-bending.ts';
import { edgeCrackTension } from './edge-crack-tension.ts';
import { surfaceCrackAt } from './surface-crack-at.ts';
import { surfaceCrackFront } from './surface-crack-front.ts';
import { surfaceCrackPoint } from './surface-crack-point.ts';
import type { SurfaceCrack } from './surface-crack.ts';

const crack: SurfaceCrack = {
  flawDepthMm: 0.1,
  flawHalfLengthMm: 0.2,
  thicknessMm: 3,
  halfWidthMm: 2,
  mode: 'bending',
};
const small = { thicknessMm: 1e6, halfWidthMm: undefined };

describe('the shape factor of a surface crack', () => {
  it('of a small half-circle is 1.04 × 1.1 × √(π/2.464) = 1.2918 at the surface and 1.04 × √(π/2.464) = 1.1743 below', () => {
    const front = surfaceCrackFront({ ...crack, ...small, flawHalfLengthMm: 0.1, mode: 'tension' });
    expect(front.firstEndFactor).toBeCloseTo(1.04 * 1.1 * Math.sqrt(Math.PI / 2.464), 6);
    expect(front.secondEndFactor).toBeCloseTo(1.04 * Math.sqrt(Math.PI / 2.464), 6);
    expect(front).toMatchObject({ largestFactor: front.firstEndFactor, largestAtDegrees: 0 });
  });

  // Largest factors of a wide plate as tabulated from the same equations by another program, three decimals.
  it.each([
    [0.2, 1.877, 1.768, 1.673, 1.516],
    [0.5, 1.588, 1.489, 1.396, 1.219],
    [0.8, 1.322, 1.275, 1.253, 1.22],
    [1, 1.292, 1.264, 1.24, 1.199],
    [1.5, 1.236, 1.217, 1.198, 1.164],
    [2, 1.161, 1.147, 1.133, 1.107],
  ])('at a/c = %d is as in the table', (shape, tension, ...bending) => {
    const wide = { ...crack, halfWidthMm: undefined, flawHalfLengthMm: 0.1 / shape };
    expect(surfaceCrackFront({ ...wide, ...small, mode: 'tension' }).largestFactor).toBeCloseTo(tension, 2.8);
    const found = [0.05, 0.1, 0.2].map(
      (depth) => surfaceCrackFront({ ...wide, thicknessMm: 0.1 / depth }).largestFactor,
    );
    found.forEach((factor, index) => expect(Math.abs(factor - (bending[index] ?? 0))).toBeLessThan(6e-4));
  });

  it('goes over smoothly where the depth passes the half-length', () => {
    for (const mode of ['tension', 'bending'] as const) {
      for (const angleRad of [0, 0.7, Math.PI / 2]) {
        const at = (shape: number) => {
          const ratios = { depthOverHalfLength: shape, depthOverThickness: 0.2, halfLengthOverWidth: 0.1 };
          return surfaceCrackAt(ratios, mode, angleRad).shapeFactor;
        };
        // the printed digits of M2 and M3 of the two branches meet to 0.004
        expect(Math.abs(at(1 + 1e-9) - at(1))).toBeLessThan(2e-4);
      }
    }
  });

  it('of a long shallow crack is that of the edge crack within 5 % at a fifth of the section', () => {
    const long = { ...crack, flawHalfLengthMm: 1000, halfWidthMm: undefined, flawDepthMm: 0.6 };
    const bent = surfaceCrackFront(long).secondEndFactor;
    const pulled = surfaceCrackFront({ ...long, mode: 'tension' }).secondEndFactor;
    expect(Math.abs(bent / edgeCrackBending({ depthOverSection: 0.2 }) - 1)).toBeLessThan(0.05);
    expect(Math.abs(pulled / edgeCrackTension({ depthOverSection: 0.2 }) - 1)).toBeLessThan(0.05);
  });

  it('lies between the ends in the one case known: a/c = 0.2, a/t = 0.5, bending', () => {
    const front = surfaceCrackFront({ ...crack, flawDepthMm: 1.5, flawHalfLengthMm: 7.5, halfWidthMm: undefined });
    expect(front.largestFactor).toBeGreaterThan(Math.max(front.firstEndFactor, front.secondEndFactor));
    expect(front.largestAtDegrees).toBeGreaterThan(0);
    expect(front.largestAtDegrees).toBeLessThan(90);
  });

  it('does not change with the unit of length', () => {
    const inUm = { flawDepthMm: 100, flawHalfLengthMm: 200, thicknessMm: 3000, halfWidthMm: 2000 };
    expect(surfaceCrackFront({ ...crack, ...inUm }).largestFactor).toBeCloseTo(
      surfaceCrackFront(crack).largestFactor,
      12,
    );
  });

  it('at a point is that of the front at its ends', () => {
    const front = surfaceCrackFront(crack);
    expect(surfaceCrackPoint({ ...crack, angleDegrees: 0 }).shapeFactor).toBe(front.firstEndFactor);
    expect(surfaceCrackPoint({ ...crack, angleDegrees: 90 }).shapeFactor).toBe(front.secondEndFactor);
  });
});

describe('the shape factor of a surface crack is refused', () => {
  it.each([
    [{ flawDepthMm: Number.NaN }, 'non-finite-input', 'flawDepthMm'],
    [{ halfWidthMm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'halfWidthMm'],
    [{ thicknessMm: 0, flawDepthMm: 0 }, 'non-positive-dimension', 'thicknessMm'],
    [{ halfWidthMm: 0 }, 'non-positive-dimension', 'halfWidthMm'],
    [{ flawDepthMm: 0 }, 'non-positive-flaw-size', 'flawDepthMm'],
    [{ flawHalfLengthMm: -0.1 }, 'non-positive-flaw-size', 'flawHalfLengthMm'],
    [{ flawDepthMm: 3, flawHalfLengthMm: 3 }, 'flaw-deeper-than-section', 'flawDepthMm'],
    [{ flawHalfLengthMm: 1 }, 'outside-validity-range', 'flawHalfLengthMm'],
    [{ flawDepthMm: 0.401 }, 'outside-validity-range', 'flawDepthMm'],
    // a/c = 0.1: the depth may be up to 1.25 × 0.7 = 0.875 of the thickness
    [{ flawDepthMm: 2.63, flawHalfLengthMm: 26.3, halfWidthMm: undefined }, 'outside-validity-range', 'flawDepthMm'],
  ])('for %o', (wrong, code, field) => {
    expect(() => surfaceCrackFront({ ...crack, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });

  it('not at the edges of the range', () => {
    expect(() => surfaceCrackFront({ ...crack, flawDepthMm: 0.4 })).not.toThrow();
    const edge = { flawDepthMm: 2.62, flawHalfLengthMm: 26.2, halfWidthMm: undefined };
    expect(() => surfaceCrackFront({ ...crack, ...edge })).not.toThrow();
  });

  it.each([-1, 91, Number.NaN])('at an angle of %d degrees', (angleDegrees) => {
    const refused = expect.objectContaining({ field: 'angleDegrees' });
    expect(() => surfaceCrackPoint({ ...crack, angleDegrees })).toThrow(refused);
  });
});
