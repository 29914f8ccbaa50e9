import { describe, expect, it } from 'vitest';
import { constantOverToughness } from './constant-over-toughness.ts';
import { mirrorFlawRatio } from './flaw-ratio.ts';

const material = { mirrorConstantMPaRootM: 2, toughnessMPaRootM: 0.8, shapeFactor: 1.28 };

describe('the mirror radius over the flaw size', () => {
  it('is (AY/K)²: (2 × 1.28/0.8)² = 3.2²', () => {
    expect(mirrorFlawRatio(material)).toBeCloseTo(10.24, 12);
  });

  it('is turned round to the constant over the toughness', () => {
    const radiusOverFlaw = mirrorFlawRatio(material);
    expect(constantOverToughness({ radiusOverFlaw, shapeFactor: 1.28 })).toBeCloseTo(2.5, 12);
  });

  it.each([
    [{ mirrorConstantMPaRootM: 0 }, 'non-positive-mirror-constant', 'mirrorConstantMPaRootM'],
    [{ toughnessMPaRootM: 0 }, 'non-positive-toughness', 'toughnessMPaRootM'],
    [{ shapeFactor: -1 }, 'non-positive-shape-factor', 'shapeFactor'],
    [{ shapeFactor: Number.NaN }, 'non-finite-input', 'shapeFactor'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => mirrorFlawRatio({ ...material, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });

  it.each([
    [{ radiusOverFlaw: 0 }, 'non-positive-dimension', 'radiusOverFlaw'],
    [{ radiusOverFlaw: Number.POSITIVE_INFINITY }, 'non-finite-input', 'radiusOverFlaw'],
    [{ shapeFactor: 0 }, 'non-positive-shape-factor', 'shapeFactor'],
  ])('is not turned round for %o', (wrong, code, field) => {
    const turned = () => constantOverToughness({ radiusOverFlaw: 10, shapeFactor: 1.29, ...wrong });
    expect(turned).toThrow(expect.objectContaining({ code, field }));
  });
});
