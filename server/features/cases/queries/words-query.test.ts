import { describe, expect, it } from 'vitest';
import { wordsQuery } from './words-query.ts';

describe('the words of a search', () => {
  it('must all stand in a case, each as the beginning of a word', () => {
    expect(wordsQuery('seal  ring')).toBe("('seal':*) & ('ring':*)");
  });

  it('find the digits of a case number alone', () => {
    expect(wordsQuery('0001')).toBe("('0001':* | '-0001':*)");
  });

  it('carry no quote into the query and pass over marks without a letter', () => {
    expect(wordsQuery("o'ring & \\ --")).toBe("('oring':*)");
    expect(wordsQuery(' ! ')).toBe('');
  });
});
