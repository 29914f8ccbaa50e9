import { describe, expect, it } from 'vitest';
import { propagateUncertainty } from './propagate.ts';
import { standardUncertaintyFrom } from './standard-uncertainty.ts';

describe('an uncertainty from independent inputs', () => {
  it('is the root of the squares: 3 and 4 give 5', () => {
    const { estimated } = propagateUncertainty({
      value: 100,
      unit: 'MPa',
      terms: [
        { input: 'A', sensitivity: -1.5, standardUncertainty: 2 },
        { input: 'R', sensitivity: 4, standardUncertainty: 1 },
      ],
    });
    expect(estimated).toEqual({ value: 100, standardUncertainty: 5, unit: 'MPa' });
  });

  it('has a budget with the largest part first and shares that make one', () => {
    const { budget } = propagateUncertainty({
      value: 100,
      unit: 'MPa',
      terms: [
        { input: 'A', sensitivity: -1.5, standardUncertainty: 2 },
        { input: 'R', sensitivity: 4, standardUncertainty: 1 },
      ],
    });
    expect(budget.map((row) => [row.input, row.contribution, row.share])).toEqual([
      ['R', 4, 16 / 25],
      ['A', 3, 9 / 25],
    ]);
  });

  it('is zero, with no shares, when every input is exact', () => {
    const { estimated, budget } = propagateUncertainty({
      value: 1,
      unit: 'MPa',
      terms: [{ input: 'A', sensitivity: 2, standardUncertainty: 0 }],
    });
    expect(estimated.standardUncertainty).toBe(0);
    expect(budget[0]?.share).toBe(0);
  });
});

describe('a stated uncertainty', () => {
  it('becomes a standard one: U/k, w/√3, w/√6', () => {
    const expanded = { kind: 'expanded', expandedUncertainty: 0.6, coverageFactor: 2 } as const;
    expect(standardUncertaintyFrom(expanded)).toBeCloseTo(0.3, 12);
    expect(standardUncertaintyFrom({ kind: 'rectangular', halfWidth: 3 })).toBeCloseTo(Math.sqrt(3), 12);
    expect(standardUncertaintyFrom({ kind: 'triangular', halfWidth: 6 })).toBeCloseTo(Math.sqrt(6), 12);
  });

  it('is refused when negative, missing, or with no coverage factor', () => {
    expect(() => standardUncertaintyFrom({ kind: 'rectangular', halfWidth: -1 })).toThrow(
      expect.objectContaining({ code: 'negative-uncertainty' }),
    );
    expect(() => standardUncertaintyFrom({ kind: 'standard', standardUncertainty: Number.NaN })).toThrow(
      expect.objectContaining({ code: 'non-finite-input' }),
    );
    expect(() => standardUncertaintyFrom({ kind: 'expanded', expandedUncertainty: 1, coverageFactor: 0 })).toThrow(
      expect.objectContaining({ code: 'non-positive-dimension' }),
    );
  });
});
