import { FractographId } from '#shared/contracts/ids.ts';
import type { MarkVersionView, MarkView } from '#shared/contracts/marks.ts';
import type { MarkRow } from './queries.ts';

export function presentMark(row: MarkRow): MarkView {
  const { id, number, fractographId } = row;
  return { id, number, fractographId: FractographId.parse(fractographId), ...presentVersion(row) };
}

export function presentVersion(row: MarkRow): MarkVersionView {
  const { kind, versionId, version, geometry, certainty, boundary, originCode, note, removed } = row;
  return {
    kind,
    versionId,
    version,
    geometry,
    certainty,
    boundary,
    originCode,
    note,
    removed,
    madeBy: { id: row.madeBy, name: row.madeByName },
    madeAt: row.madeAt.toISOString(),
  };
}
