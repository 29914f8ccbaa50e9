const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;
const shortMonthLength = 3;
const msPerDay = 86_400_000;
const noBreakSpace = '\u00A0';

/** A day in full: "9 March 2026". Takes an instant or a date in ISO 8601; the day is that of UTC. */
export function formatDay(iso: string): string {
  const at = new Date(iso);
  return `${at.getUTCDate()} ${monthOf(at)} ${at.getUTCFullYear()}`;
}

/** A day in a table or margin: "9 Mar", with the year where it is not `year`. */
export function formatShortDay(iso: string, year?: number): string {
  const at = new Date(iso);
  const day = `${at.getUTCDate()}${noBreakSpace}${monthOf(at).slice(0, shortMonthLength)}`;
  return year === undefined || year === at.getUTCFullYear() ? day : `${day}${noBreakSpace}${at.getUTCFullYear()}`;
}

/** An instant in the trail: "9 March 2026, 14:05 UTC". */
export function formatInstant(iso: string): string {
  const at = new Date(iso);
  const [hours, minutes] = [at.getUTCHours(), at.getUTCMinutes()].map((part) => String(part).padStart(2, '0'));
  return `${formatDay(iso)}, ${hours}:${minutes} UTC`;
}

/** Whole days from one instant to another, rounded down; 0 where `to` lies before `from`. */
export function daysBetween(from: string, to: string): number {
  return Math.max(0, Math.floor((Date.parse(to) - Date.parse(from)) / msPerDay));
}

/** An age: "6 d". */
export function formatAge(days: number): string {
  return `${days}${noBreakSpace}d`;
}

/** The day of an instant as a date, "2026-03-09", in UTC. */
export function dayOf(at: Date): string {
  return at.toISOString().slice(0, 10);
}

function monthOf(at: Date): string {
  return months[at.getUTCMonth()] ?? '';
}
