import { createHash, randomUUID } from 'node:crypto';
import { fractographs, keptFiles } from '#server/database/tables/fractographs.ts';
import { marks, markVersions } from '#server/database/tables/marks.ts';
import type { OriginCode } from '#shared/vocabulary/origin-codes.ts';
import type { Admitted } from './test-server.ts';

/** A figure that is ready, with one origin mark on it, written as rows. Gives the figure's id. */
export function anOrigin(
  reader: Admitted,
  { caseId, originCode, at }: { caseId: string; originCode: OriginCode; at: { x: number; y: number } },
): Promise<string> {
  const sha256 = createHash('sha256').update(randomUUID()).digest('hex');
  return reader.context.inTransaction(async (tx) => {
    const [madeBy, madeAt] = [reader.person.id, tx.at];
    await tx.db.insert(keptFiles).values({ sha256, bytes: 1, keptAt: madeAt });
    const file = { caseId, figureNumber: 1, sha256, fileName: 'face-a.tif', bytes: 1, broughtInBy: madeBy };
    const ready = { state: 'ready', progress: 1, widthPx: 2000, heightPx: 1000, broughtInAt: madeAt } as const;
    const [figure] = await tx.db
      .insert(fractographs)
      .values({ ...file, ...ready })
      .returning({ id: fractographs.id });
    const [mark] = await tx.db
      .insert(marks)
      .values({ caseId, fractographId: figure.id, number: 1, kind: 'origin' })
      .returning({ id: marks.id });
    const drawn = { caseId, markId: mark.id, version: 1, certainty: 'likely', originCode, madeBy, madeAt } as const;
    await tx.db.insert(markVersions).values({ ...drawn, geometry: { shape: 'point', at } });
    return figure.id;
  });
}
