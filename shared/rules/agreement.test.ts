import { describe, expect, it } from 'vitest';
import { judgeAgreement, judgePair, type LineReading } from './agreement.ts';

const pair = { stress1MPa: 300, u1MPa: 6, stress2MPa: 300, u2MPa: 8, covarianceMPa2: 0 };

function reading(
  line: LineReading['line'],
  stressMPa: number,
  standardUncertaintyMPa: number,
  rest: Partial<LineReading> = {},
): LineReading {
  return { line, stressMPa, standardUncertaintyMPa, setAside: false, shared: [], ...rest };
}

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

describe('the verdict on a case', () => {
  it('is the worst of its pairs, whichever way the lines are listed', () => {
    const lines = [reading('load', 310, 8), reading('mirror', 245, 25), reading('flaw', 290, 35)];
    expect(judgeAgreement(lines).verdict).toBe('doubtful');
    expect(judgeAgreement([...lines].reverse()).verdict).toBe('doubtful');
  });

  it('is too few with one line, or with all but one set aside', () => {
    expect(judgeAgreement([reading('mirror', 245, 25)]).verdict).toBe('too few');
    const aside = [reading('load', 310, 8), reading('mirror', 245, 25, { setAside: true })];
    expect(judgeAgreement(aside)).toMatchObject({ verdict: 'too few', pooled: null, pattern: null, ruleVersion: 1 });
  });

  it('leaves out a line set aside', () => {
    const lines = [reading('load', 310, 8), reading('mirror', 900, 9, { setAside: true }), reading('flaw', 300, 30)];
    expect(judgeAgreement(lines).verdict).toBe('agree');
  });

  it('names what two lines share, and counts it', () => {
    const scale = { key: 'calibration:6', label: 'scale of the image' };
    const mirror = reading('mirror', 300, 25, { shared: [{ ...scale, contributionMPa: -10 }] });
    const flaw = reading('flaw', 340, 30, { shared: [{ ...scale, contributionMPa: -15 }] });
    const [judged] = judgeAgreement([mirror, flaw]).pairs;
    expect(judged?.sharedInputs).toEqual(['scale of the image']);
    // 625 + 900 − 2 × 150 = 1225, ζ = −40/35
    expect(judged?.zeta).toBeCloseTo(-40 / 35, 12);
  });

  it('is lowered to doubtful when the lines fit no common stress', () => {
    const two = judgeAgreement([reading('load', 100, 10), reading('mirror', 127.9, 10)]);
    // ζ = 27.9/14.142 = 1.973, χ² = 3.892 over 3.841
    expect(two).toMatchObject({ verdict: 'doubtful', chiSquaredOverLimit: true, pooled: null });
  });

  it('says which line is between the others when they form a chain', () => {
    const lines = [reading('load', 310, 8), reading('mirror', 245, 25), reading('flaw', 290, 35)];
    expect(judgeAgreement(lines).pattern).toEqual({ kind: 'ambiguous', middle: 'flaw' });
  });

  it('is not given for a line without uncertainty', () => {
    expect(() => judgeAgreement([reading('load', 310, 0), reading('mirror', 300, 20)])).toThrow(
      expect.objectContaining({ code: 'missing-uncertainty' }),
    );
  });
});
