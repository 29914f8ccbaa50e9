import { estimatedParts, type EstimatedParts } from '#shared/wording/quantity.ts';

/** One line of evidence as the chart shows it. */
export type EvidenceLine = {
  line: 'load' | 'mirror' | 'flaw';
  /** "Load". */
  label: string;
  /** What it was read from: "m3, Fig. 2". */
  sublabel: string;
  /** Stress at the origin, MPa; null where the line has not been reckoned. */
  value: number | null;
  /** U at k = 2, MPa, ≥ 0. */
  expandedUncertainty: number;
  /** Rests on an input that has changed since. */
  stale?: boolean;
  /** Kept, shown, and left out of the comparison. */
  setAside?: boolean;
};

/** A line whose stress is there to be drawn. */
export type ReckonedLine = EvidenceLine & { value: number };

/** Lines that have a stress. */
export function reckonedLines(rows: readonly EvidenceLine[]): ReckonedLine[] {
  return rows.flatMap((row) => (row.value === null ? [] : [{ ...row, value: row.value }]));
}

/** Stress ± U and unit in parts, with U to two significant figures at most. */
export function stressParts(row: ReckonedLine): EstimatedParts {
  const estimated = { value: row.value, standardUncertainty: row.expandedUncertainty / 2, unit: 'MPa' } as const;
  return estimatedParts(estimated, row.expandedUncertainty >= 1 ? { decimals: 0 } : {});
}

/** The stresses, MPa, that lie inside the interval of every line not set aside; null where none does or fewer than two are there. */
export function sharedStressesMPa(rows: readonly EvidenceLine[]): { from: number; to: number } | null {
  const compared = reckonedLines(rows).filter((row) => !row.setAside);
  if (compared.length < 2) return null;
  const from = Math.max(...compared.map((row) => row.value - row.expandedUncertainty));
  const to = Math.min(...compared.map((row) => row.value + row.expandedUncertainty));
  return from < to ? { from, to } : null;
}

const countWords: Record<number, string> = { 2: 'both', 3: 'all three' };

/** What the compared lines share, in words: "shared by all three, 370 to 386". Null where fewer than two are compared. */
export function sharedWords(rows: readonly EvidenceLine[]): string | null {
  const count = reckonedLines(rows).filter((row) => !row.setAside).length;
  if (count < 2) return null;
  const shared = sharedStressesMPa(rows);
  const counted = countWords[count] ?? `all ${count}`;
  if (!shared) return `no stress is shared by ${counted}`;
  return `shared by ${counted}, ${Math.round(shared.from)} to ${Math.round(shared.to)}`;
}

/** The whole chart as a sentence for whoever doesn't see it. */
export function evidenceSentence(rows: readonly EvidenceLine[]): string {
  const stresses = rows.map((row) => {
    const [reckoned] = reckonedLines([row]);
    if (!reckoned) return `${row.label} not reckoned`;
    const { value, plusMinus, unit } = stressParts(reckoned);
    const remark = [row.stale && 'stale', row.setAside && 'set aside'].filter(Boolean).join(', ');
    return `${row.label} ${value} ± ${plusMinus} ${unit}${remark === '' ? '' : ` (${remark})`}`;
  });
  const words = sharedWords(rows);
  return `Stress at the origin with expanded uncertainty, k = 2: ${stresses.join('; ')}.${words ? ` In MPa, ${words}.` : ''}`;
}
