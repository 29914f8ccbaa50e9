import { describe, expect, it } from 'vitest';
import { sizeInWords, timeLeftInWords } from './size-in-words.ts';

describe('what is on its way in', () => {
  it.each([
    [512, '512 bytes'],
    [12_345, '12 kB'],
    [412_300_000, '412 MB'],
    [999_900_000, '1.0 GB'],
    [2_400_000_000, '2.4 GB'],
  ])('of %d bytes reads %s', (bytes, words) => {
    expect(sizeInWords(bytes).replaceAll('\u00a0', ' ')).toBe(words);
  });

  it.each([
    [3, 'a few seconds'],
    [42, 'about 40 s'],
    [200, 'about 3 min'],
    [Infinity, ''],
  ])('with %d s to go reads %s', (seconds, words) => {
    expect(timeLeftInWords(seconds).replaceAll('\u00a0', ' ')).toBe(words);
  });
});
