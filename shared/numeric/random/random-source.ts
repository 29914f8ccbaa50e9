import { inverseNormal } from '../special-functions/inverse-normal.ts';
import { splitMix64 } from './split-mix-64.ts';

export type RandomSource = {
  /** The next whole number, 0 to 2³² − 1. */
  readonly next: () => number;
  /** The next number, 0 or more and less than 1, with 53 bits; takes two whole numbers. */
  readonly uniform: () => number;
  /** The next standard normal deviate; takes as many as `uniform`, so that counts stay fixed. */
  readonly normal: () => number;
};

export type RandomState = readonly [number, number, number, number];

/** Kept with every run, so that an old record can be run again. */
export const generatorName = 'xoshiro128** 1.1, seeded by SplitMix64';

/**
 * Chance from a 64-bit seed.
 * @throws RangeError for a seed that is not a whole number from 0 to 2⁵³ − 1 (a bigint is taken modulo 2⁶⁴)
 * @example randomFromSeed(42).uniform() // 0.4137016681565887
 */
export function randomFromSeed(seed: number | bigint): RandomSource {
  if (typeof seed === 'number' && (!Number.isSafeInteger(seed) || seed < 0)) {
    throw new RangeError('A seed is a whole number, 0 or more.');
  }
  const [first = 0n, second = 0n] = splitMix64(BigInt(seed), 2);
  return randomFromState([low(first), high(first), low(second), high(second)]);
}

/**
 * Chance from the four words of a state.
 * Source: Blackman and Vigna, xoshiro128** 1.1.
 * @throws RangeError for the state that is all zero, which never leaves it
 */
export function randomFromState([s0, s1, s2, s3]: RandomState): RandomSource {
  if ((s0 | s1 | s2 | s3) === 0) throw new RangeError('A state of zeros gives only zeros.');
  let [a, b, c, d] = [s0 | 0, s1 | 0, s2 | 0, s3 | 0];
  const next = () => {
    const result = Math.imul(turned(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = turned(d, 11);
    return result;
  };
  const uniform = () => {
    const upper = next() >>> 5;
    const lower = next() >>> 6;
    return (upper * 2 ** 26 + lower) / 2 ** 53;
  };
  // 0 has no normal deviate; half of the smallest step stands for it
  const normal = () => inverseNormal(uniform() || 2 ** -54);
  return { next, uniform, normal };
}

function turned(word: number, by: number): number {
  return (word << by) | (word >>> (32 - by));
}

const low = (word: bigint) => Number(word & 0xffffffffn);
const high = (word: bigint) => Number(word >> 32n);
