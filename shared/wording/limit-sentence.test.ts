import { describe, expect, it } from 'vitest';
import { limitSentence } from './limit-sentence.ts';

const slivers = { code: 'M2', description: 'slivers along c1', missingReason: 'swept up with the yard.' };

describe('the limit that a missing piece sets', () => {
  it('is said while it is not known whether the origin lies on it', () => {
    expect(limitSentence({ ...slivers, originLies: 'not known' })).toBe(
      'M2 (slivers along c1) was not there to be examined: swept up with the yard. Whether the origin lies on it is not known.',
    );
  });
  it('is said more strongly when the origin may lie on it', () => {
    expect(limitSentence({ ...slivers, originLies: 'yes' })).toContain('The origin may lie on it');
  });
  it('is not said when the origin lies elsewhere', () => {
    expect(limitSentence({ ...slivers, originLies: 'no' })).toBeNull();
  });
});
