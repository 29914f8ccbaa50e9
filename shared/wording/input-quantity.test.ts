import { describe, expect, it } from 'vitest';
import { inputText } from './input-quantity.ts';

const plain = (text: string) => text.replaceAll('\u00A0', ' ');

describe('an input as text', () => {
  it('shows a length under 1 mm in µm, with U of the same decimals', () => {
    expect(plain(inputText({ value: 0.291, standardUncertainty: 0.008, unit: 'mm' }))).toBe('291 ± 16 µm');
    expect(plain(inputText({ value: 2.9972, standardUncertainty: 0.01, unit: 'mm' }))).toBe('2.997 ± 0.020 mm');
  });

  it('keeps the units of a large U, so that the value is not rounded to tens', () => {
    expect(plain(inputText({ value: 0.559, standardUncertainty: 0.06, unit: 'mm' }))).toBe('559 ± 120 µm');
  });

  it('shows no ± for an input that is exact', () => {
    expect(plain(inputText({ value: 0, standardUncertainty: 0, unit: 'mm' }))).toBe('0 mm');
    expect(plain(inputText({ value: 1.29, standardUncertainty: 0, unit: '1' }))).toBe('1.29');
  });
});
