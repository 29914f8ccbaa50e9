import { describe, expect, it } from 'vitest';
import { boundParts, boundText } from './bound-value.ts';

const usual = { interval: true, decimals: null, significant: null } as const;
const text = (value: number, standardUncertainty: number, unit: string, format = {}) =>
  boundText(boundParts({ value, standardUncertainty, unit }, { ...usual, ...format })).replaceAll('\u00A0', ' ');

describe('a value bound into a sentence', () => {
  it('carries its interval to two figures and its unit', () => {
    expect(text(278.66, 12.9, 'MPa')).toBe('279 ± 26 MPa');
    expect(text(8.5, 0.3, 'MPa√m')).toBe('8.50 ± 0.60 MPa m½');
    expect(text(380, 15, 'GPa')).toBe('380 ± 30 GPa');
  });

  it('reads lengths under a millimetre in micrometres', () => {
    expect(text(0.104, 0.0055, 'mm')).toBe('104 ± 11 µm');
    expect(text(1.9, 0.05, 'mm')).toBe('1.90 ± 0.10 mm');
  });

  it('is written to the decimals or the figures asked for', () => {
    expect(text(278.66, 12.9, 'MPa', { decimals: 1 })).toBe('278.7 ± 25.8 MPa');
    expect(text(278.66, 1.29, 'MPa', { significant: 1 })).toBe('279 ± 3 MPa');
    expect(text(1278.66, 112.9, 'MPa')).toBe('1279 ± 226 MPa');
  });
});
