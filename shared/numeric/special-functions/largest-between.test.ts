import { describe, expect, it } from 'vitest';
import { largestBetween } from './largest-between.ts';

describe('the largest value between two arguments', () => {
  it('is found between the steps of the scan', () => {
    const peak = largestBetween({ from: 0, to: 1, steps: 10, of: (x) => 2 - (x - 0.537) ** 2 });
    expect(peak.value).toBeCloseTo(2, 14);
    // a flat top is found to the root of the rounding
    expect(peak.at).toBeCloseTo(0.537, 7);
  });

  it('is exactly the end where the function only rises or only falls', () => {
    expect(largestBetween({ from: 0, to: 1.3, steps: 7, of: (x) => x })).toEqual({ at: 1.3, value: 1.3 });
    expect(largestBetween({ from: 0, to: 1.3, steps: 7, of: (x) => -x })).toMatchObject({ at: 0 });
  });

  it('is the larger of two peaks', () => {
    const of = (x: number) => Math.exp(-100 * (x - 0.2) ** 2) + 1.1 * Math.exp(-100 * (x - 0.8) ** 2);
    expect(largestBetween({ from: 0, to: 1, steps: 20, of }).at).toBeCloseTo(0.8, 6);
  });
});
