/**
 * An instant as a clock in that zone shows it, with the zone: "24 June 2026, 11:04 BST". `zone` is an IANA name such as
 * "Europe/London"; one that is not known is shown in UTC.
 */
export function formatInstantIn(iso: string, zone: string): string {
  const parts = partsIn(iso, zone) ?? partsIn(iso, 'UTC') ?? {};
  return `${parts.day} ${parts.month} ${parts.year}, ${parts.hour}:${parts.minute} ${parts.timeZoneName}`;
}

function partsIn(iso: string, timeZone: string): Record<string, string> | null {
  try {
    const format = new Intl.DateTimeFormat('en-GB', {
      ...({ day: 'numeric', month: 'long', year: 'numeric', hour: '2-digit', minute: '2-digit' } as const),
      hourCycle: 'h23',
      timeZoneName: 'short',
      timeZone,
    });
    return Object.fromEntries(format.formatToParts(new Date(iso)).map(({ type, value }) => [type, value]));
  } catch {
    return null;
  }
}
