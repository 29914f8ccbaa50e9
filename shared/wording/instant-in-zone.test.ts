import { describe, expect, it } from 'vitest';
import { formatInstantIn } from './instant-in-zone.ts';

describe('an instant beside a signature', () => {
  it('says the zone, in summer and in winter', () => {
    expect(formatInstantIn('2026-06-24T10:04:00.000Z', 'Europe/London')).toBe('24 June 2026, 11:04 BST');
    expect(formatInstantIn('2026-02-10T10:04:00.000Z', 'Europe/London')).toBe('10 February 2026, 10:04 GMT');
  });

  it('may fall on another day there', () => {
    expect(formatInstantIn('2026-06-24T23:30:00.000Z', 'Asia/Tokyo')).toBe('25 June 2026, 08:30 GMT+9');
  });

  it('is shown in UTC where the zone is not known', () => {
    expect(formatInstantIn('2026-06-24T00:05:00.000Z', 'No/Where')).toBe('24 June 2026, 00:05 UTC');
  });
});
