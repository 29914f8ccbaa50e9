import type { MarkGeometry, MarkView } from '#shared/contracts/marks.ts';
import { markReadings, type OriginMark, type ReadingScale } from '#shared/rules/mark-readings.ts';
import { originCodeTable } from '#shared/vocabulary/origin-codes.ts';
import { readingText } from '#shared/wording/mark-reading.ts';
import { formatNumber } from '#shared/wording/quantity.ts';

/** A mark in the list; one that is not kept yet has no number. */
export type ListedMark = Omit<MarkView, 'number'> & { readonly number: number | null; readonly waiting: boolean };

/** What readings of an image hang on. */
export type ReadFrom = { readonly scale: ReadingScale | null; readonly origin: (OriginMark & { id: string }) | null };

export const markName = (mark: Pick<ListedMark, 'number'>) => (mark.number === null ? 'new' : `m${mark.number}`);

/** What was seen, in a few words: "machining damage, likely". */
export function seenWords(
  mark: Pick<ListedMark, 'kind' | 'geometry' | 'certainty' | 'boundary' | 'originCode' | 'note'>,
) {
  const words = [...kindWords(mark), mark.certainty];
  return words.filter((word) => word !== '').join(', ');
}

function kindWords(mark: Parameters<typeof seenWords>[0]): string[] {
  const { geometry } = mark;
  if (mark.kind === 'note') return [mark.note];
  if (mark.originCode) return [originCodeTable[mark.originCode].word];
  if (geometry.shape === 'ellipse') return [`${geometry.flawShape}, ${geometry.place}`];
  if (mark.kind === 'hackle' && geometry.shape === 'segment') return [`runs out ${towards(geometry)}`];
  if (geometry.shape === 'segment') return [geometry.measures === 'depth of origin' ? 'depth of the origin' : ''];
  if (geometry.shape === 'chain') return [boundaryWords(mark.boundary), `${geometry.points.length} points`];
  return [];
}

const boundaryWords = (boundary: MarkView['boundary']) =>
  boundary === null ? '' : boundary === 'not stated' ? 'boundary not stated' : boundary;

const eighths = [
  'to the right',
  'to upper right',
  'straight up',
  'to upper left',
  'to the left',
  'to lower left',
  'straight down',
  'to lower right',
] as const;

function towards({ from, to }: Extract<MarkGeometry, { shape: 'segment' }>): string {
  const turn = Math.atan2(from.y - to.y, to.x - from.x) / (Math.PI / 4);
  return eighths[(Math.round(turn) + 8) % 8];
}

/** What the mark says as numbers, in words; its place where it says none. */
export function readingWords(mark: ListedMark, from: ReadFrom): string {
  const readings = markReadings(mark, from.scale, from.origin);
  if (readings.length > 0) return readings.map(readingText).join('; ');
  if (mark.kind === 'mirror') return 'no radius: mark the origin';
  if (mark.geometry.shape !== 'point') return '';
  const { x, y } = mark.geometry.at;
  return `at ${formatNumber(Math.round(x))}, ${formatNumber(Math.round(y))}\u00a0px`;
}
