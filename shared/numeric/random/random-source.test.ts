import { describe, expect, it } from 'vitest';
import { randomFromSeed, randomFromState } from './random-source.ts';
import { seedOfTask, splitMix64 } from './split-mix-64.ts';

function taken<Value>(count: number, take: () => Value): Value[] {
  return Array.from({ length: count }, take);
}

// Vectors from a separate whole-number implementation of the published algorithms (Steele, Lea and Flood 2014; Blackman
// and Vigna, xoshiro128** 1.1); the values of SplitMix64 for 1234567 are widely published too.
describe('the vectors of the generator', () => {
  it('hold for SplitMix64 from 1234567', () => {
    const published = [6457827717110365317n, 3203168211198807973n, 9817491932198370423n];
    expect(splitMix64(1234567n, 3)).toEqual(published);
  });

  it('hold for xoshiro128** from the state 1, 2, 3, 4', () => {
    const source = randomFromState([1, 2, 3, 4]);
    expect(taken(6, source.next)).toEqual([11520, 0, 5927040, 70819200, 2031721883, 1637235492]);
  });

  it('hold for xoshiro128** seeded with 42, word by word and as numbers below 1', () => {
    expect(taken(4, randomFromSeed(42).next)).toEqual([1776835114, 4165204688, 17111135, 2317295270]);
    const numbers = [0.4137016681565887, 0.003983993377814743, 0.6500837027638867, 0.6846020186141416];
    expect(taken(4, randomFromSeed(42).uniform)).toEqual(numbers);
  });

  it('hold for the mean of 100 000 Weibull draws, m = 10, S = 500 MPa, seed 42', () => {
    const source = randomFromSeed(42);
    const draws = taken(100_000, () => 500 * (-Math.log1p(-source.uniform())) ** (1 / 10));
    const mean = draws.reduce((sum, each) => sum + each, 0) / draws.length;
    // the reference is printed to ten figures
    expect(Math.abs(mean / 475.4756705 - 1)).toBeLessThan(1e-9);
  });
});

describe('a source of chance', () => {
  it('gives the same digits for the same seed, and others for another', () => {
    const digits = taken(20, randomFromSeed(7).normal);
    expect(taken(20, randomFromSeed(7).normal)).toEqual(digits);
    expect(taken(20, randomFromSeed(8).normal)).not.toEqual(digits);
  });

  it('gives normal deviates with mean 0 and variance 1', () => {
    const draws = taken(100_000, randomFromSeed(1).normal);
    const mean = draws.reduce((sum, each) => sum + each, 0) / draws.length;
    const variance = draws.reduce((sum, each) => sum + each ** 2, 0) / draws.length;
    // four standard errors: 4/√N, and 4√(2/N) for the variance
    expect(Math.abs(mean)).toBeLessThan(0.0127);
    expect(Math.abs(variance - 1)).toBeLessThan(0.0179);
  });

  it('gives each numbered task a seed of its own', () => {
    const seeds = [0, 1, 2].map((task) => seedOfTask(1234567n, task));
    expect(seeds).toEqual(splitMix64(1234567n, 3));
  });

  it('is refused for a state of zeros and for a seed that is no whole number', () => {
    expect(() => randomFromState([0, 0, 0, 0])).toThrow(RangeError);
    expect(() => randomFromSeed(0.5)).toThrow(RangeError);
    expect(() => randomFromSeed(-1)).toThrow(RangeError);
    expect(() => randomFromSeed(Number.NaN)).toThrow(RangeError);
  });
});
