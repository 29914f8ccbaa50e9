const fewestDigits = 4;

/** The number of the nth case received in a year: "HB-2026-0001". `position` ≥ 1. */
export function caseNumberOf(year: number, position: number): string {
  return `HB-${year}-${String(position).padStart(fewestDigits, '0')}`;
}
