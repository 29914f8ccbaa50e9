import { and, asc, eq, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { MarkGeometry } from '#shared/contracts/marks.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { lineage } from '../../../database/tables/acts.ts';
import { figures } from '../../../database/tables/findings.ts';
import { calibrationBindings, calibrations, fractographs } from '../../../database/tables/fractographs.ts';
import { marks, markVersions } from '../../../database/tables/marks.ts';
import type { HeldCase } from './bound-values.ts';

const follower = alias(figures, 'follower');

export type FigureRow = Awaited<ReturnType<typeof listFigureRows>>[number];

/** Every figure of the case's text, replaced ones too, oldest first. */
export function listFigureRows(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({
      id: figures.id,
      fractographId: figures.fractographId,
      figureNumber: fractographs.figureNumber,
      sha256: fractographs.sha256,
      imageWidthPx: fractographs.widthPx,
      imageHeightPx: fractographs.heightPx,
      framePx: figures.framePx,
      caption: figures.caption,
      scaleBar: figures.scaleBar,
      supersededById: follower.id,
      madeAt: figures.madeAt,
    })
    .from(figures)
    .innerJoin(fractographs, eq(fractographs.id, figures.fractographId))
    .leftJoin(follower, eq(follower.supersedesId, figures.id))
    .where(eq(figures.caseId, heldCase.id))
    .orderBy(asc(figures.madeAt), asc(figures.id));
}

export async function insertFigure(tx: Transaction, values: typeof figures.$inferInsert) {
  const [row] = await tx.db.insert(figures).values(values).returning({ id: figures.id });
  return row;
}

export type FigureMark = Awaited<ReturnType<typeof listFigureMarks>>[number];

/** The marks of the case's figures, each as it stood when the figure was drawn. */
export function listFigureMarks(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({
      figureId: figures.id,
      id: marks.id,
      number: marks.number,
      kind: marks.kind,
      versionId: markVersions.id,
      geometry: sql<MarkGeometry>`${markVersions.geometry}`,
    })
    .from(figures)
    .innerJoin(
      lineage,
      and(eq(lineage.toId, figures.id), eq(lineage.toKind, 'figure'), eq(lineage.fromKind, 'mark version')),
    )
    .innerJoin(markVersions, eq(markVersions.id, lineage.fromId))
    .innerJoin(marks, eq(marks.id, markVersions.markId))
    .where(eq(figures.caseId, heldCase.id))
    .orderBy(asc(marks.number));
}

/** The scale each figure of the case was drawn with. */
export function listFigureScales(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({ figureId: figures.id, pixelSizeXUm: calibrations.pixelSizeXUm })
    .from(figures)
    .innerJoin(
      lineage,
      and(eq(lineage.toId, figures.id), eq(lineage.toKind, 'figure'), eq(lineage.fromKind, 'calibration binding')),
    )
    .innerJoin(calibrationBindings, eq(calibrationBindings.id, lineage.fromId))
    .innerJoin(calibrations, eq(calibrations.id, calibrationBindings.calibrationId))
    .where(eq(figures.caseId, heldCase.id));
}
