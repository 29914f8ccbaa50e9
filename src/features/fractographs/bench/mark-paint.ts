import { markReadings } from '#shared/rules/mark-readings.ts';
import { markKindTable, type MarkKindRow } from '#shared/vocabulary/mark-kinds.ts';
import { readingText } from '#shared/wording/mark-reading.ts';
import type { ReadingScale } from '#shared/rules/mark-readings.ts';
import type { ShownMark } from './bench-state.ts';
import { kindTable } from './kinds/kind-table.ts';
import { nameOf } from './readout.ts';

// A canvas knows no custom properties: the theme's colours are read off the root once.
const inks = new Map<string, string>();

/** The colour behind a custom property of the theme. Marks have the same in both themes. */
export function inkOf(property: string): string {
  const known = inks.get(property);
  if (known) return known;
  const ink = getComputedStyle(document.documentElement).getPropertyValue(property).trim();
  if (ink) inks.set(property, ink);
  return ink || '#ffffff';
}

export const haloInk = () => inkOf('--m-halo');

export type Paint = {
  readonly ink: string;
  readonly row: MarkKindRow;
  /** Certainty shows in the line: certain full, likely and possible lighter. */
  readonly widthScreenPx: number;
  readonly strength: number;
};

const strengthOf = { certain: 1, likely: 0.82, possible: 0.62 } as const;
const selectedWidthScreenPx = 2.6;

export function paintOf(mark: Pick<ShownMark, 'kind' | 'certainty'>, isSelected: boolean): Paint {
  const row: MarkKindRow = markKindTable[mark.kind];
  const strength = strengthOf[mark.certainty];
  const base = row.widthScreenPx * (mark.certainty === 'certain' ? 1 : 0.8);
  const widthScreenPx = isSelected ? Math.max(selectedWidthScreenPx, row.widthScreenPx) : base;
  return { ink: inkOf(row.colour), row, widthScreenPx, strength };
}

/** "m3 mirror, outer"; only "m3" where it is crowded. What is not certain says so. */
export function labelWords(
  mark: ShownMark,
  from: { scale: ReadingScale | null; origin: ShownMark | null },
  isShort: boolean,
): string {
  const name = nameOf(mark);
  const doubt = mark.certainty === 'certain' ? '' : `, ${mark.certainty}`;
  if (isShort) return name;
  const [reading] = markReadings(mark, from.scale, from.origin);
  const words = kindTable[mark.kind].labelWords(mark, reading ? readingText(reading) : null);
  return [name, words].filter((word) => word !== '').join(' ') + doubt;
}
