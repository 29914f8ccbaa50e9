import { formatShortDay } from '#shared/wording/dates.ts';

/** An instant in a narrow column: "today 09:40", or its day. In UTC, like every instant of the trail. */
export function whenWords(iso: string, now: Date): string {
  const isToday = iso.slice(0, 10) === now.toISOString().slice(0, 10);
  return isToday ? `today\u00A0${iso.slice(11, 16)}` : formatShortDay(iso, now.getUTCFullYear());
}
