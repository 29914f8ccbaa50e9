import { describe, expect, it } from 'vitest';
import { daysBetween, formatAge, formatDay, formatInstant, formatShortDay } from './dates.ts';

describe('a date in words', () => {
  it('reads in full in a sentence and short in a table', () => {
    expect(formatDay('2026-03-09')).toBe('9 March 2026');
    expect(formatShortDay('2026-03-09T23:59:00Z')).toBe('9\u00A0Mar');
  });

  it('carries the year in a table only where it is another', () => {
    expect(formatShortDay('2026-03-09', 2026)).toBe('9\u00A0Mar');
    expect(formatShortDay('2025-03-09', 2026)).toBe('9\u00A0Mar\u00A02025');
  });

  it('names its zone with a time', () => {
    expect(formatInstant('2026-06-22T14:05:31Z')).toBe('22 June 2026, 14:05 UTC');
  });
});

describe('an age', () => {
  it('counts whole days and is never less than none', () => {
    expect(daysBetween('2026-05-04T12:00:00Z', '2026-05-10T11:59:00Z')).toBe(5);
    expect(daysBetween('2026-05-10T00:00:00Z', '2026-05-04T00:00:00Z')).toBe(0);
    expect(formatAge(6)).toBe('6\u00A0d');
  });
});
