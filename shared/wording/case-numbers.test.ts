import { describe, expect, it } from 'vitest';
import { CaseNumber } from '../contracts/ids.ts';
import { caseNumberOf } from './case-numbers.ts';

describe('a case number', () => {
  it('says the year and the place in it, with four digits at least', () => {
    expect(caseNumberOf(2026, 1)).toBe('HB-2026-0001');
    expect(caseNumberOf(2026, 12345)).toBe('HB-2026-12345');
  });

  it('reads back by its contract', () => {
    expect(CaseNumber.safeParse(caseNumberOf(2031, 87)).success).toBe(true);
  });
});
