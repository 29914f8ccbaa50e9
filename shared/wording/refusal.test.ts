import { describe, expect, it } from 'vitest';
import { refusalCodes } from '../numeric/refusal-codes.ts';
import { refusalInWords } from './refusal.ts';

describe('a refusal in words', () => {
  it('says what is wrong with which field and what would be right', () => {
    expect(refusalInWords('inner-span-not-less-than-outer', 'Inner span')).toBe(
      'Inner span must be less than the outer span.',
    );
  });

  it.each(refusalCodes)('of %s is a sentence with the field and no code word in it', (code) => {
    const sentence = refusalInWords(code, 'Rim');
    expect(sentence).toMatch(/^[A-Z].*\.$/);
    expect(sentence).toMatch(/\bRim\b/);
    expect(sentence).not.toContain(code);
  });
});
