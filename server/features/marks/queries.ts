import { and, asc, desc, eq, getTableColumns, isNull, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { MarkGeometry } from '#shared/contracts/marks.ts';
import type { MeasuredQuantity } from '#shared/vocabulary/measured-quantities.ts';
import type { Reader, Transaction } from '../../database/connection.ts';
import { counters } from '../../database/tables/acts.ts';
import { calibrationBindings, calibrations, fractographs } from '../../database/tables/fractographs.ts';
import { marks, markVersions, measurements } from '../../database/tables/marks.ts';
import { people } from '../../database/tables/people.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import type { HeldFor } from '../../rights/open-case.ts';

export type HeldCase = HeldFor<CaseAct>;

const newer = alias(markVersions, 'newer');

const markColumns = {
  id: marks.id,
  number: marks.number,
  kind: marks.kind,
  fractographId: marks.fractographId,
  versionId: markVersions.id,
  version: markVersions.version,
  geometry: sql<MarkGeometry>`${markVersions.geometry}`,
  certainty: markVersions.certainty,
  boundary: markVersions.boundary,
  originCode: markVersions.originCode,
  note: markVersions.note,
  removed: markVersions.removed,
  madeBy: markVersions.madeBy,
  madeByName: people.name,
  madeAt: markVersions.madeAt,
};

export type MarkRow = Awaited<ReturnType<typeof listMarkRows>>[number];

/** Marks of the case as they stand, removed ones too; of one fractograph where one is named. */
export function listMarkRows(reader: Reader, heldCase: HeldCase, fractographId?: string) {
  const inForce = and(eq(marks.caseId, heldCase.id), isNull(newer.id));
  return selectMarks(reader)
    .leftJoin(newer, and(eq(newer.markId, marks.id), eq(newer.version, sql`${markVersions.version} + 1`)))
    .where(fractographId ? and(inForce, eq(marks.fractographId, fractographId)) : inForce)
    .orderBy(asc(marks.number));
}

/** Every state one mark has had, newest first. */
export function listVersionRows(reader: Reader, heldCase: HeldCase, markId: string) {
  return selectMarks(reader)
    .where(and(eq(marks.caseId, heldCase.id), eq(marks.id, markId)))
    .orderBy(desc(markVersions.version));
}

/** A mark as it stands. */
export async function findMarkRow(reader: Reader, heldCase: HeldCase, markId: string) {
  const [row] = await listVersionRows(reader, heldCase, markId).limit(1);
  return row ?? null;
}

function selectMarks(reader: Reader) {
  return reader.db
    .select(markColumns)
    .from(marks)
    .innerJoin(markVersions, eq(markVersions.markId, marks.id))
    .innerJoin(people, eq(people.id, markVersions.madeBy));
}

/** The next mark number of a case: m1, m2 and so on, without gap, from a counter row locked until the act is kept. */
export async function takeMarkNumber(tx: Transaction, heldCase: HeldCase): Promise<number> {
  const [row] = await tx.db
    .insert(counters)
    .values({ name: `marks of ${heldCase.id}`, value: 1 })
    .onConflictDoUpdate({ target: counters.name, set: { value: sql`${counters.value} + 1` } })
    .returning({ value: counters.value });
  return row.value;
}

/** @returns nothing where a mark of that id is there already. */
export async function insertMark(tx: Transaction, values: typeof marks.$inferInsert) {
  const [row] = await tx.db.insert(marks).values(values).onConflictDoNothing({ target: marks.id }).returning();
  return row;
}

export async function insertVersion(tx: Transaction, values: typeof markVersions.$inferInsert) {
  const [row] = await tx.db.insert(markVersions).values(values).returning({ id: markVersions.id });
  return row;
}

/** What of an image a mark rests on: its size and its figure. */
export async function findMarkedImage(reader: Reader, heldCase: HeldCase, fractographId: string) {
  const { id, figureNumber, state, widthPx, heightPx } = getTableColumns(fractographs);
  const [row] = await reader.db
    .select({ id, figureNumber, state, widthPx, heightPx })
    .from(fractographs)
    .where(and(eq(fractographs.caseId, heldCase.id), eq(fractographs.id, fractographId)));
  return row ?? null;
}

export function listFigureNumbers(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({ id: fractographs.id, figureNumber: fractographs.figureNumber })
    .from(fractographs)
    .where(eq(fractographs.caseId, heldCase.id));
}

const newerBinding = alias(calibrationBindings, 'newer_binding');

/** The scale in force of each image of the case. */
export function listScales(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({
      bindingId: calibrationBindings.id,
      fractographId: calibrationBindings.fractographId,
      pixelSizeXUm: calibrations.pixelSizeXUm,
      pixelSizeYUm: calibrations.pixelSizeYUm,
      relativeUncertainty: calibrations.relativeUncertainty,
    })
    .from(calibrationBindings)
    .innerJoin(calibrations, eq(calibrations.id, calibrationBindings.calibrationId))
    .leftJoin(newerBinding, eq(newerBinding.supersedesId, calibrationBindings.id))
    .where(and(eq(calibrationBindings.caseId, heldCase.id), isNull(newerBinding.id)));
}

export type ReadFrom = {
  markVersionId: string;
  originVersionId: string | null;
  bindingId: string;
  quantity: MeasuredQuantity;
};

export async function findMeasurement(reader: Reader, read: ReadFrom) {
  const [row] = await reader.db
    .select()
    .from(measurements)
    .where(
      and(
        eq(measurements.markVersionId, read.markVersionId),
        eq(measurements.bindingId, read.bindingId),
        eq(measurements.quantity, read.quantity),
        read.originVersionId
          ? eq(measurements.originVersionId, read.originVersionId)
          : isNull(measurements.originVersionId),
      ),
    );
  return row ?? null;
}

export async function insertMeasurement(tx: Transaction, values: typeof measurements.$inferInsert) {
  const [row] = await tx.db.insert(measurements).values(values).returning();
  return row;
}
