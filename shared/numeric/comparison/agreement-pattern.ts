/** What three lines of evidence show together; `high` and `low` are against the mean of the two that agree. */
export type AgreementPattern =
  | { readonly kind: 'all-agree' }
  | { readonly kind: 'outlier'; readonly line: string; readonly side: 'high' | 'low' }
  /** Two pairs agree and one does not; `middle` is the line that agrees with both others. */
  | { readonly kind: 'ambiguous'; readonly middle: string }
  | { readonly kind: 'none-agree' };

type Reading = { readonly line: string; readonly stressMPa: number };
type Pairing = { readonly lines: readonly [string, string]; readonly agrees: boolean };

/** The pattern of three lines from which of their pairs agree. */
export function agreementPattern(readings: readonly Reading[], pairs: readonly Pairing[]): AgreementPattern {
  const agreeing = pairs.filter((pair) => pair.agrees);
  if (agreeing.length === pairs.length) return { kind: 'all-agree' };
  const [first, second] = agreeing;
  if (!first) return { kind: 'none-agree' };
  if (second) {
    const middle = first.lines.find((line) => second.lines.includes(line));
    return { kind: 'ambiguous', middle: middle ?? first.lines[0] };
  }
  return outlier(readings, first.lines);
}

function outlier(readings: readonly Reading[], together: readonly string[]): AgreementPattern {
  const alone = readings.find((reading) => !together.includes(reading.line));
  if (!alone) return { kind: 'none-agree' };
  const others = readings.filter((reading) => together.includes(reading.line));
  const mean = others.reduce((sum, reading) => sum + reading.stressMPa, 0) / others.length;
  return { kind: 'outlier', line: alone.line, side: alone.stressMPa > mean ? 'high' : 'low' };
}
