import { describe, expect, it } from 'vitest';
import { incompleteBeta } from './incomplete-beta.ts';
import { inverseNormal } from './inverse-normal.ts';
import { logGamma } from './log-gamma.ts';
import { studentTQuantile, twoSidedP } from './student-t.ts';

describe('the gamma function', () => {
  it('is the factorial, and √π at one half', () => {
    expect(logGamma(5)).toBeCloseTo(Math.log(24), 13);
    expect(logGamma(0.5)).toBeCloseTo(Math.log(Math.PI) / 2, 13);
    expect(logGamma(0.25) + logGamma(0.75)).toBeCloseTo(Math.log(Math.PI * Math.SQRT2), 12);
  });
});

describe('the incomplete beta function', () => {
  it('is x for a = b = 1, and x²(3 − 2x) for a = b = 2', () => {
    expect(incompleteBeta({ x: 0.3, a: 1, b: 1 })).toBeCloseTo(0.3, 13);
    expect(incompleteBeta({ x: 0.8, a: 2, b: 2 })).toBeCloseTo(0.64 * 1.4, 13);
  });

  it('runs from 0 to 1', () => {
    expect(incompleteBeta({ x: 0, a: 2, b: 3 })).toBe(0);
    expect(incompleteBeta({ x: 1, a: 2, b: 3 })).toBe(1);
  });
});

describe('the normal quantile', () => {
  // printed in every table to these digits
  it.each([
    [0.5, 0],
    [0.975, 1.959963984540054],
    [0.9986501019683699, 3],
    [0.0227501319481792, -2],
    [1e-10, -6.361340902404056],
    [1e-20, -9.262340089798409],
  ])('at %d is %d', (probability, quantile) => {
    expect(inverseNormal(probability)).toBeCloseTo(quantile, 12);
  });

  it('has no end', () => {
    expect(inverseNormal(0)).toBe(Number.NEGATIVE_INFINITY);
    expect(inverseNormal(1)).toBe(Number.POSITIVE_INFINITY);
  });
});

describe("Student's t", () => {
  it('has for one degree of freedom the quantiles of Cauchy: tan π(p − ½)', () => {
    expect(studentTQuantile({ probability: 0.975, degreesOfFreedom: 1 })).toBeCloseTo(Math.tan(Math.PI * 0.475), 9);
    expect(studentTQuantile({ probability: 0.1, degreesOfFreedom: 1 })).toBeCloseTo(Math.tan(-Math.PI * 0.4), 11);
  });

  it('has for two degrees of freedom a closed form: a/√(2p(1 − p)) with a = 2p − 1', () => {
    const probability = 0.9;
    const closed = (2 * probability - 1) / Math.sqrt(2 * probability * (1 - probability));
    expect(studentTQuantile({ probability, degreesOfFreedom: 2 })).toBeCloseTo(closed, 11);
  });

  it('tends to the normal', () => {
    expect(studentTQuantile({ probability: 0.975, degreesOfFreedom: 1e6 })).toBeCloseTo(1.959966, 5);
  });

  it('has a chance of one at 0, and is turned round by its quantile', () => {
    expect(twoSidedP({ t: 0, degreesOfFreedom: 4 })).toBe(1);
    const t = studentTQuantile({ probability: 0.99, degreesOfFreedom: 7 });
    expect(twoSidedP({ t, degreesOfFreedom: 7 })).toBeCloseTo(0.02, 12);
    expect(studentTQuantile({ probability: 0.5, degreesOfFreedom: 7 })).toBe(0);
  });
});
