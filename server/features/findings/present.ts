import type { FindingsVersionLine } from '#shared/contracts/findings.ts';
import type { VersionRow } from './queries/versions.ts';

export function presentVersion({
  madeBy,
  madeByName,
  madeAt,
  id,
  number,
  name,
  contentHash,
}: VersionRow): FindingsVersionLine {
  return { id, number, name, contentHash, madeBy: { id: madeBy, name: madeByName }, madeAt: madeAt.toISOString() };
}
