import { describe, expect, it } from 'vitest';
import { compareWays, readingsAreApart } from './calibration-check.ts';

const bar = (pixelSizeUm: number) => ({ name: 'the bar', pixelSizeUm });
const tag = (pixelSizeUm: number) => ({ name: 'the file’s own tag', pixelSizeUm });

describe('two ways to one scale', () => {
  it('pass without a question up to 3 % apart', () => {
    expect(compareWays(bar(1.03), [tag(1)])).toEqual([]);
    expect(compareWays(bar(0.97), [tag(1)])).toEqual([]);
  });

  it('ask from just above 3 %', () => {
    expect(compareWays(bar(1.031), [tag(1)])).toMatchObject([{ kind: 'apart', against: 'the file’s own tag' }]);
  });

  it.each([
    [2.2, 1.1, 'near double'],
    [1.1, 2.2, 'near half'],
    [10.1, 1, 'near ten times'],
    [0.1, 1, 'near a tenth'],
  ])('of %d and %d µm/px name the slip', (chosen, other, kind) => {
    expect(compareWays(bar(chosen), [tag(other)])[0]?.kind).toBe(kind);
  });

  it('are each held against the chosen one', () => {
    expect(compareWays(bar(1), [tag(1), { name: 'CAL-02', pixelSizeUm: 2 }])).toHaveLength(1);
  });
});

describe('two readings of one bar', () => {
  it('need a word when further apart than 3 %', () => {
    expect(readingsAreApart(0.03)).toBe(false);
    expect(readingsAreApart(0.031)).toBe(true);
  });
});
