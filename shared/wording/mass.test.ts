import { describe, expect, it } from 'vitest';
import { formatMass } from './mass.ts';

const spaced = (text: string) => text.replaceAll('\u00A0', ' ');

describe('a mass in words', () => {
  it.each([
    [{ g: 6412, uncertaintyG: 5, entered: '6.412 kg ± 5 g' }, '6.412 ± 0.005 kg'],
    [{ g: 14_190, uncertaintyG: 5, entered: '14.19 ± 0.005 kg' }, '14.190 ± 0.005 kg'],
    [{ g: 418, uncertaintyG: 2, entered: '0.418 kg ± 2 g' }, '0.418 ± 0.002 kg'],
    [{ g: 11.8, uncertaintyG: 0.1, entered: null }, '11.8 ± 0.1 g'],
    [{ g: 0.025, uncertaintyG: 0.0002, entered: null }, '25.0 ± 0.2 mg'],
  ])('keeps every digit of what was weighed', (mass, words) => {
    expect(spaced(formatMass(mass))).toBe(words);
  });
});
