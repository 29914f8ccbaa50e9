import { describe, expect, it } from 'vitest';
import { gradientFactor } from './gradient-factor.ts';

describe('the gradient factor of a mirror in bending', () => {
  // printed to three digits: reckoned by another program from the same equations
  it.each([
    [0.05, 0.979, 0.933],
    [0.1, 0.96, 0.867],
    [0.3, 0.905, 0.605],
    [0.4, 0.886, 0.472],
  ])('at R/d = %d is %d along the surface and %d at depth', (radiusOverDepth, surface, depth) => {
    const found = gradientFactor({ radiusOverDepth });
    expect(Math.abs(found.surface - surface)).toBeLessThan(0.0005001);
    expect(Math.abs(found.depth - depth)).toBeLessThan(0.0005001);
  });

  it('tends to 1 for a small mirror, and falls faster at depth', () => {
    const small = gradientFactor({ radiusOverDepth: 1e-6 });
    expect(small.surface).toBeCloseTo(1, 5);
    expect(small.depth).toBeCloseTo(1, 5);
    const { surface, depth } = gradientFactor({ radiusOverDepth: 0.25 });
    expect(depth).toBeLessThan(surface);
  });

  it.each([
    [0, 'non-positive-mirror-radius'],
    [1, 'outside-validity-range'],
    [Number.NaN, 'non-finite-input'],
    [Number.POSITIVE_INFINITY, 'non-finite-input'],
  ])('is refused at R/d = %d', (radiusOverDepth, code) => {
    expect(() => gradientFactor({ radiusOverDepth })).toThrow(expect.objectContaining({ code }));
  });
});
