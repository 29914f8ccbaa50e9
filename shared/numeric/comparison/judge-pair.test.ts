import { describe, expect, it } from 'vitest';
import { judgePair } from './judge-pair.ts';

const pair = { stress1MPa: 300, u1MPa: 6, stress2MPa: 300, u2MPa: 8, covarianceMPa2: 0 };

describe('two stresses', () => {
  // √(6² + 8²) = 10 MPa, so each 10 MPa apart is one standard uncertainty
  it.each([
    [320, 'agree'],
    [320.01, 'doubtful'],
    [330, 'doubtful'],
    [330.01, 'disagree'],
    [270, 'doubtful'],
  ])('300 and %f MPa with 10 MPa between them %s', (stress2MPa, verdict) => {
    expect(judgePair({ ...pair, stress2MPa }).verdict).toBe(verdict);
  });

  it('agree weakly when one of them is uncertain by more than a quarter', () => {
    expect(judgePair({ ...pair, u2MPa: 75 })).toMatchObject({ verdict: 'agree', weakly: false });
    expect(judgePair({ ...pair, u2MPa: 76 })).toMatchObject({ verdict: 'agree', weakly: true });
  });

  it('are further apart in their own terms when they share an input', () => {
    const apart = { ...pair, stress2MPa: 318 };
    expect(judgePair(apart).verdict).toBe('agree');
    // 36 + 64 − 2 × 20 = 60, ζ = 18/7.75 = 2.32
    expect(judgePair({ ...apart, covarianceMPa2: 20 }).verdict).toBe('doubtful');
  });

  it.each([
    [{ u1MPa: 0 }, 'missing-uncertainty', 'u1MPa'],
    [{ u2MPa: -1 }, 'missing-uncertainty', 'u2MPa'],
    [{ stress1MPa: Number.NaN }, 'non-finite-input', 'stress1MPa'],
    [{ covarianceMPa2: 50 }, 'outside-validity-range', 'covarianceMPa2'],
  ])('are not compared for %o', (wrong, code, field) => {
    expect(() => judgePair({ ...pair, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
