import { describe, expect, it } from 'vitest';
import { parseQuantity } from '../numeric/units/parse-quantity.ts';
import {
  echoQuantity,
  estimatedParts,
  formatEstimated,
  formatLength,
  formatNumber,
  formatQuantity,
} from './quantity.ts';

const stress = (value: number, expanded: number) =>
  ({ value, standardUncertainty: expanded / 2, unit: 'MPa' }) as const;

describe('an estimate as text', () => {
  it.each([
    [349.96, 14.0, '350 ± 14 MPa'],
    [186.79, 8.43, '186.8 ± 8.4 MPa'],
    [2327.4, 484.1, '2330 ± 480 MPa'],
    [57.55, 0.996, '57.6 ± 1.0 MPa'],
    [123.4, 9.96, '123 ± 10 MPa'],
    [-12.5, 3, '−12.5 ± 3.0 MPa'],
    [12345, 250, '12\u202F350 ± 250 MPa'],
    [0.2, 14, '0 ± 14 MPa'],
    [-0.2, 14, '0 ± 14 MPa'],
  ])('%f with U %f is %s', (value, expanded, text) => {
    expect(formatEstimated(stress(value, expanded))).toBe(text.replace(/ /g, '\u00A0'));
  });

  it('takes the decimals asked for, the same in value and U', () => {
    expect(formatEstimated(stress(349.96, 14.0), { decimals: 1 })).toBe('350.0\u00A0±\u00A014.0\u00A0MPa');
  });

  it('comes in parts for styled rendering', () => {
    expect(estimatedParts(stress(349.96, 14.0))).toEqual({ value: '350', plusMinus: '14', unit: 'MPa' });
  });

  it('writes a toughness with its root', () => {
    const toughness = { value: 3.5, standardUncertainty: 0.1, unit: 'MPa√m' } as const;
    expect(formatEstimated(toughness)).toBe('3.50\u00A0±\u00A00.20\u00A0MPa\u00A0m½');
  });
});

describe('a length as text', () => {
  it('is in micrometres below 1 mm and in millimetres from there', () => {
    expect(formatLength(0.56)).toBe('560\u00A0µm');
    expect(formatLength(1)).toBe('1\u00A0mm');
    expect(formatLength(-0.0641)).toBe('−64.1\u00A0µm');
    expect(formatLength(0)).toBe('0\u00A0mm');
    expect(formatLength(3, { decimals: 2 })).toBe('3.00\u00A0mm');
  });
});

describe('a number as text', () => {
  it('has at most four figures, and whole numbers stay whole', () => {
    expect(formatNumber(2.9972)).toBe('2.997');
    expect(formatNumber(421)).toBe('421');
    expect(formatNumber(12345)).toBe('12\u202F345');
    expect(formatNumber(9999)).toBe('9999');
    expect(formatNumber(1_234_567)).toBe('1\u202F234\u202F567');
  });

  it('rounds halves away from zero as they are written', () => {
    expect(formatNumber(1.005, { decimals: 2 })).toBe('1.01');
    expect(formatNumber(-2.5, { decimals: 0 })).toBe('−3');
  });

  it('has no unit when it is a plain ratio', () => {
    expect(formatQuantity({ value: 1.29, unit: '1' })).toBe('1.29');
  });
});

describe('a typed length', () => {
  it('is read back in our unit', () => {
    const read = parseQuantity(' 0.118 in ', { kind: 'length', openUnit: true });
    expect(read.kind === 'read' && echoQuantity(read)).toBe('0.118 in reads 2.997\u00A0mm');
  });
});
