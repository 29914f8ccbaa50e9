import { describe, expect, it } from 'vitest';
import { leadSentence, reviewSentence, staleSentence } from './lead-sentence.ts';

const counts = {
  ...{ thisYear: 15, all: 227, open: 11, withMe: 3, toSign: 0, stale: 3, inReview: 2 },
  oldestOpenAt: '2026-01-20T10:00:00Z',
  asOf: '2026-03-12T11:00:00Z',
};

describe('the sentence over the Casebook', () => {
  it('says how many cases, how many open, and how old the oldest is', () => {
    expect(leadSentence(counts)).toBe('Fifteen cases this year, eleven open, the oldest for 51 days.');
    expect(leadSentence({ ...counts, thisYear: 0, open: 0, oldestOpenAt: null })).toBe(
      'No cases this year, none open.',
    );
  });

  it('says what is stale and what waits', () => {
    expect(staleSentence(1)).toBe('One holds ');
    expect(staleSentence(0)).toBe('Nothing is stale');
    expect(reviewSentence(2)).toBe('two wait for a reviewer.');
  });
});
