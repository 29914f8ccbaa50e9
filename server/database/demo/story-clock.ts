const minuteMs = 60_000;
const dayMs = 24 * 60 * minuteMs;
const saturday = 6;

/** The clock of the demo's story: set to a morning, and a few minutes on after each act. */
export class StoryClock {
  #at = new Date('2026-04-20T08:00:00Z');

  /** The instant of the act under way. */
  readonly now = (): Date => new Date(this.#at);

  set(day: string, time: string): void {
    this.#at = new Date(`${day}T${time}:00Z`);
  }

  passMinutes(minutes: number): void {
    this.#at = new Date(this.#at.getTime() + minutes * minuteMs);
  }
}

/** The day so many working days later, or earlier where the count is negative. */
export function workingDay(day: string, count: number): string {
  const step = Math.sign(count);
  let at = new Date(`${day}T12:00:00Z`);
  for (let left = Math.abs(count); left > 0;) {
    at = new Date(at.getTime() + step * dayMs);
    if (at.getUTCDay() !== 0 && at.getUTCDay() !== saturday) left -= 1;
  }
  return at.toISOString().slice(0, 10);
}
