import { describe, expect, it } from 'vitest';
import { bisect } from './bisect.ts';

describe('the root between two arguments', () => {
  it('is found to the last digit', () => {
    expect(bisect({ from: 0, to: 2, of: (x) => x * x - 2 })).toBeCloseTo(Math.SQRT2, 15);
  });

  it('is found however small it is', () => {
    expect(bisect({ from: 0, to: 1, of: (x) => x - 3e-200 }) / 3e-200).toBeCloseTo(1, 14);
  });

  it('is an argument at which the function is no longer below 0', () => {
    const of = (x: number) => Math.exp(x) - 3;
    expect(of(bisect({ from: 0, to: 2, of }))).toBeGreaterThanOrEqual(0);
  });
});
