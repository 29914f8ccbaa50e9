import type { MeasuredQuantity } from '#shared/vocabulary/measured-quantities.ts';
import { markReadings, type LengthReading } from '#shared/rules/mark-readings.ts';
import type { Reader } from '../../../database/connection.ts';
import { listMarkRows, listScales, type HeldCase, type MarkRow } from '../queries.ts';

export type CaseReading = {
  readonly mark: MarkRow;
  /** The origin mark the length was read from; null where it was read from the mark alone. */
  readonly origin: MarkRow | null;
  /** The scale in force on the image; null while it has none. */
  readonly bindingId: string | null;
  readonly reading: LengthReading;
};

/** Every length that the marks of a case say now, on the scales in force. */
export async function readCase(reader: Reader, heldCase: HeldCase): Promise<CaseReading[]> {
  const rows = (await listMarkRows(reader, heldCase)).filter((row) => !row.removed);
  const scales = new Map((await listScales(reader, heldCase)).map((scale) => [scale.fractographId, scale]));
  const origins = originsByImage(rows);
  return rows.flatMap((mark) => {
    const scale = scales.get(mark.fractographId) ?? null;
    const origin = mark.kind === 'mirror' ? (origins.get(mark.fractographId) ?? null) : null;
    return markReadings(mark, scale, origin).flatMap((reading) =>
      reading.quantity === 'hackle direction' ? [] : [{ mark, origin, bindingId: scale?.bindingId ?? null, reading }],
    );
  });
}

/** One wanted length, or null where the mark does not say it. */
export async function readOne(
  reader: Reader,
  heldCase: HeldCase,
  wanted: { markId: string; quantity: MeasuredQuantity },
): Promise<CaseReading | null> {
  const readings = await readCase(reader, heldCase);
  return (
    readings.find(({ mark, reading }) => mark.id === wanted.markId && reading.quantity === wanted.quantity) ?? null
  );
}

/** The origin of each image: the first drawn that still stands. */
function originsByImage(rows: readonly MarkRow[]): Map<string, MarkRow> {
  const origins = new Map<string, MarkRow>();
  for (const row of rows) {
    if (row.kind === 'origin' && !origins.has(row.fractographId)) origins.set(row.fractographId, row);
  }
  return origins;
}
