import { describe, expect, it } from 'vitest';
import { ellipticE } from './elliptic-e.ts';

describe('the elliptic integral of the second kind', () => {
  it('is a quarter of the way round a circle at one end, and 1 at the other', () => {
    expect(ellipticE(1)).toBeCloseTo(Math.PI / 2, 15);
    expect(ellipticE(0)).toBe(1);
    expect(ellipticE(1e-9)).toBeCloseTo(1, 14);
  });

  it('is as printed in tables: E(k² = 0.5) = 1.3506438810', () => {
    expect(ellipticE(Math.sqrt(0.5))).toBeCloseTo(1.350643881, 9);
  });

  it('is the integral of √(1 − k² sin² θ), summed by the rule of Simpson', () => {
    for (const complement of [0.05, 0.2, 0.6, 0.95]) {
      const steps = 4000;
      const at = (step: number) => Math.sqrt(1 - (1 - complement ** 2) * Math.sin((step * Math.PI) / (2 * steps)) ** 2);
      let sum = at(0) + at(steps);
      for (let step = 1; step < steps; step += 1) sum += at(step) * (step % 2 === 1 ? 4 : 2);
      expect(ellipticE(complement)).toBeCloseTo((sum * Math.PI) / (6 * steps), 11);
    }
  });

  it.each([-0.1, 1.1, Number.NaN, Number.POSITIVE_INFINITY])('is refused for %d', (complement) => {
    expect(() => ellipticE(complement)).toThrow(expect.objectContaining({ field: 'complementaryModulus' }));
  });
});
