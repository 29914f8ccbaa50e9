import { describe, expect, it } from 'vitest';
import { verdictInWords, patternInWords } from '../wording/verdict.ts';
import { compareLines, type ComparedEstimate } from './compare-lines.ts';

// Case 0001: mirror 359.2 and flaw 339.1 MPa, both read by one calibration of ± 0.5 % (k = 2).
const radius = { input: 'R', value: 0.56, calibrationId: 'cal-06', relativeUncertainty: 0.0025 };
const mirror: ComparedEstimate = {
  line: 'mirror',
  stressMPa: 359.2,
  standardUncertaintyMPa: 16.65,
  budget: [{ input: 'R', sensitivity: -359.2 / (2 * 0.56) }],
  readings: [radius],
};
const flaw: ComparedEstimate = {
  line: 'flaw',
  stressMPa: 339.1,
  standardUncertaintyMPa: 28.2,
  budget: [{ input: 'c', sensitivity: -339.1 / (2 * 0.064) }],
  readings: [{ ...radius, input: 'c', value: 0.064 }],
};
const load: ComparedEstimate = { line: 'load', stressMPa: 350, standardUncertaintyMPa: 7, budget: [], readings: [] };

describe('lines read by one calibration', () => {
  it('are called two lines, one scale', () => {
    const words = verdictInWords(compareLines([load, mirror, flaw]));
    expect(words).toContain('Mirror and flaw are two lines, one scale');
  });

  it('are judged by the difference that their scale leaves: cov = ¼ σ_M σ_F (u_s/s)²', () => {
    const [pair] = compareLines([mirror, flaw]).pairs;
    const covariance = (359.2 * 339.1 * 0.0025 ** 2) / 4;
    const expected = (359.2 - 339.1) / Math.sqrt(16.65 ** 2 + 28.2 ** 2 - 2 * covariance);
    expect(pair?.zeta).toBeCloseTo(expected, 9);
  });

  it('share nothing when each has a calibration of its own', () => {
    const other = { ...flaw, readings: [{ ...radius, input: 'c', value: 0.064, calibrationId: 'cal-04' }] };
    expect(compareLines([mirror, other]).pairs[0]?.sharedInputs).toEqual([]);
  });
});

describe('the verdict in words', () => {
  it('names the widest gap and the line that stands alone', () => {
    const far = { ...flaw, stressMPa: 452.2, standardUncertaintyMPa: 10 };
    const agreement = compareLines([load, mirror, far]);
    expect(agreement.verdict).toBe('disagree');
    expect(verdictInWords(agreement)).toContain('load against flaw');
    expect(patternInWords(agreement)).toBe('The flaw line alone is high.');
  });

  it('says of one line that there is nothing to compare', () => {
    expect(verdictInWords(compareLines([load]))).toContain('nothing to compare');
  });
});
