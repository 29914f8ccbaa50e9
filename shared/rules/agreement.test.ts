import { describe, expect, it } from 'vitest';
import { judgeAgreement, type LineReading } from './agreement.ts';

function reading(
  line: LineReading['line'],
  stressMPa: number,
  standardUncertaintyMPa: number,
  rest: Partial<LineReading> = {},
): LineReading {
  return { line, stressMPa, standardUncertaintyMPa, setAside: false, shared: [], ...rest };
}

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
