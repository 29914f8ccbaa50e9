import type { ScaleView } from '#shared/contracts/fractographs.ts';
import type { Reader } from '../../../database/connection.ts';
import { listOpenStaleness } from '../../../lineage/settle-staleness.ts';
import { presentScale } from '../present.ts';
import { listBindingsInForce, listBindingsOf, type BindingRow } from '../queries/bindings.ts';

/** The scale in force of one image; null while it is uncalibrated, and then no length is had from it. */
export async function findScale(reader: Reader, fractographId: string): Promise<ScaleView | null> {
  return (await listScales(reader, [fractographId])).get(fractographId) ?? null;
}

/** The scales in force of several images, by the image's id; uncalibrated ones are not in it. */
export async function listScales(reader: Reader, fractographIds: readonly string[]): Promise<Map<string, ScaleView>> {
  const rows = await listBindingsInForce(reader, fractographIds);
  const scales = await withStaleness(reader, rows);
  return new Map(rows.map((row, index) => [row.binding.fractographId, scales[index]]));
}

/** Every binding of an image, newest first, with why each was made. */
export async function listScaleHistory(reader: Reader, fractographId: string) {
  const rows = await listBindingsOf(reader, fractographId);
  const scales = await withStaleness(reader, rows);
  return rows.map((row, index) => ({ ...scales[index], inForce: row.inForce, reason: row.binding.reason }));
}

async function withStaleness(reader: Reader, rows: readonly BindingRow[]): Promise<ScaleView[]> {
  const stale = await listOpenStaleness(
    reader,
    rows.map((row) => row.binding.id),
  );
  return rows.map((row) => presentScale(row, stale.find((each) => each.recordId === row.binding.id) ?? null));
}
