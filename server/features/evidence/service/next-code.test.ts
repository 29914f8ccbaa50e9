import { describe, expect, it } from 'vitest';
import { nextCode } from './next-code.ts';

describe('the code of a piece', () => {
  it('starts at F1 and goes on after the highest', () => {
    expect(nextCode([], { way: 'break', parentCode: null })).toBe('F1');
    expect(nextCode(['F1', 'F9', 'F10', 'M1'], { way: 'break', parentCode: null })).toBe('F11');
  });
  it('counts what is not there by itself', () => {
    expect(nextCode(['F1', 'F2', 'M1'], { way: 'missing', parentCode: null })).toBe('M2');
  });
  it('stands behind that of the piece it was made from, and counts through the case', () => {
    expect(nextCode(['F1', 'F2'], { way: 'replica', parentCode: 'F1' })).toBe('F1/R1');
    expect(nextCode(['F1', 'F1/R1', 'F2'], { way: 'replica', parentCode: 'F2' })).toBe('F2/R2');
    expect(nextCode(['F1', 'F1/R1'], { way: 'section', parentCode: 'F1' })).toBe('F1/S1');
  });
});
