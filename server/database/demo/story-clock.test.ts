import { describe, expect, it } from 'vitest';
import { StoryClock, workingDay } from './story-clock.ts';

describe('the clock of the demo', () => {
  it('goes on by minutes from the morning it was set to', () => {
    const clock = new StoryClock();
    clock.set('2026-05-04', '09:10');
    clock.passMinutes(4);
    expect(clock.now().toISOString()).toBe('2026-05-04T09:14:00.000Z');
  });

  it('counts working days over a weekend, forward and back', () => {
    expect(workingDay('2026-05-08', 1)).toBe('2026-05-11');
    expect(workingDay('2026-10-05', -1)).toBe('2026-10-02');
    expect(workingDay('2026-05-04', 0)).toBe('2026-05-04');
  });
});
