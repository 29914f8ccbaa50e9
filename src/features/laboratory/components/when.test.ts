import { describe, expect, it } from 'vitest';
import { whenWords } from './when.ts';

const now = new Date('2026-10-19T12:00:00Z');

describe('an instant in a narrow column', () => {
  it('is the time of day today, else the day, with the year where it is another', () => {
    expect(whenWords('2026-10-19T09:40:12.000Z', now)).toBe('today\u00A009:40');
    expect(whenWords('2026-10-16T09:40:12.000Z', now)).toBe('16\u00A0Oct');
    expect(whenWords('2025-10-16T09:40:12.000Z', now)).toBe('16\u00A0Oct\u00A02025');
  });
});
