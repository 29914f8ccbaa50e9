import { describe, expect, it } from 'vitest';
import { cornerCrackAt } from './corner-crack-at.ts';
import { cornerCrackFront } from './corner-crack-front.ts';
import { cornerCrackPoint } from './corner-crack-point.ts';
import type { CornerCrack } from './corner-crack.ts';

const crack: CornerCrack = { flawDepthMm: 0.1, flawLengthMm: 0.1, thicknessMm: 3, widthMm: 4, mode: 'tension' };

describe('the shape factor of a corner crack', () => {
  it('of a small quarter-circle is 1.05 × 1.08² × √(π/2.464) = 1.28 at 0 and at 90°, since one g is 1.08 and one is 1', () => {
    const front = cornerCrackFront({ ...crack, thicknessMm: 1e6, widthMm: undefined });
    // M1 = 1.08 − 0.03 = 1.05; g1 g2 = 1.08 × 1
    expect(front.firstEndFactor).toBeCloseTo(1.05 * 1.08 * Math.sqrt(Math.PI / 2.464), 6);
    expect(front.secondEndFactor).toBeCloseTo(front.firstEndFactor, 9);
    expect(front.largestFactor).toBeCloseTo(1.2805, 4);
  });

  it('of a small quarter-circle is 1.190 in the middle of the front', () => {
    const middle = cornerCrackPoint({ ...crack, thicknessMm: 1e6, widthMm: undefined, angleDegrees: 45 });
    expect(middle.shapeFactor).toBeCloseTo(1.19, 3);
  });

  it('goes over smoothly where the depth passes the length', () => {
    const at = (shape: number) => {
      const ratios = { depthOverHalfLength: shape, depthOverThickness: 0.3, halfLengthOverWidth: 0.2 };
      return cornerCrackAt(ratios, 'bending', 0.6).shapeFactor;
    };
    // M2, M3 of the two branches meet within their printed digits
    expect(Math.abs(at(1 + 1e-9) - at(1))).toBeLessThan(2e-3);
  });

  it('is lower in bending than in tension', () => {
    expect(cornerCrackFront({ ...crack, mode: 'bending' }).largestFactor).toBeLessThan(
      cornerCrackFront(crack).largestFactor,
    );
  });

  it.each([
    [{ widthMm: Number.NaN }, 'non-finite-input', 'widthMm'],
    [{ thicknessMm: -1 }, 'non-positive-dimension', 'thicknessMm'],
    [{ flawLengthMm: 0 }, 'non-positive-flaw-size', 'flawLengthMm'],
    [{ flawDepthMm: 3 }, 'flaw-deeper-than-section', 'flawDepthMm'],
    [{ flawLengthMm: 2, flawDepthMm: 1 }, 'outside-validity-range', 'flawLengthMm'],
    [{ flawDepthMm: 0.201 }, 'outside-validity-range', 'flawDepthMm'],
    [{ flawDepthMm: 0.0199 }, 'outside-validity-range', 'flawDepthMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => cornerCrackFront({ ...crack, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });

  it('is refused beyond the front', () => {
    const refused = expect.objectContaining({ code: 'outside-validity-range', field: 'angleDegrees' });
    expect(() => cornerCrackPoint({ ...crack, angleDegrees: 90.1 })).toThrow(refused);
  });
});
