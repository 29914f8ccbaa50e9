import { describe, expect, it } from 'vitest';
import { hashOfContent } from './canonical-hash.ts';
import { readSealNumber, sealNumberOf } from './seal-number.ts';

const signs = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
const numbers = Array.from({ length: 40 }, (_, n) => sealNumberOf(hashOfContent({ closure: n })));
const plain = (number: string) => number.replaceAll('-', '');

describe('a seal number', () => {
  it('reads in three groups of four and a check sign', () => {
    for (const number of numbers) expect(number).toMatch(/^([0-9A-HJKMNP-TV-Z]{4}-){3}[0-9A-HJKMNP-TV-Z]$/);
  });

  it('is read back as people type it', () => {
    const [number] = numbers;
    expect(readSealNumber(` ${number.toLowerCase().replaceAll('-', ' ')} `)).toBe(number);
    const withNought = numbers.find((each) => each.includes('0')) ?? '';
    expect(readSealNumber(withNought.replace('0', 'O'))).toBe(withNought);
    const withOne = numbers.find((each) => each.includes('1')) ?? '';
    expect(readSealNumber(withOne.replace('1', 'l'))).toBe(withOne);
  });

  it('is refused with any one sign wrong, in every place', () => {
    for (const number of numbers) {
      const right = plain(number);
      for (let place = 0; place < right.length; place += 1) {
        for (const sign of signs) {
          if (sign === right[place]) continue;
          expect(readSealNumber(right.slice(0, place) + sign + right.slice(place + 1))).toBeNull();
        }
      }
    }
  });

  it('is refused with any two unlike neighbours changed about', () => {
    for (const number of numbers) {
      const right = plain(number);
      for (let place = 0; place + 1 < right.length; place += 1) {
        if (right[place] === right[place + 1]) continue;
        const swapped = right.slice(0, place) + right[place + 1] + right[place] + right.slice(place + 2);
        expect(readSealNumber(swapped)).toBeNull();
      }
    }
  });

  it.each(['', '7QK4', 'U'.repeat(13), '0'.repeat(14), '7QK4-M2XD-91HV-*'])('is refused as “%s”', (typed) => {
    expect(readSealNumber(typed)).toBeNull();
  });

  it('is made from a whole digest only', () => {
    expect(() => sealNumberOf('abc')).toThrow('SHA-256');
  });
});
