import { and, asc, eq, inArray, isNotNull, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { staleness } from '../../../database/tables/acts.ts';
import { boundValues } from '../../../database/tables/findings.ts';
import { calibrationBindings, fractographs } from '../../../database/tables/fractographs.ts';
import { marks, markVersions, measurements } from '../../../database/tables/marks.ts';
import { materialConstants, materials } from '../../../database/tables/materials.ts';
import type { HeldFor } from '../../../rights/open-case.ts';

export type HeldCase = HeldFor<CaseAct>;

const follower = alias(boundValues, 'follower');

export type BoundValueRow = Awaited<ReturnType<typeof listBoundValueRows>>[number];

/** Every value bound in the case, replaced ones too, oldest first. */
export function listBoundValueRows(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({
      id: boundValues.id,
      sourceKind: boundValues.sourceKind,
      sourceId: boundValues.sourceId,
      quantity: boundValues.quantity,
      format: boundValues.format,
      supersededById: follower.id,
      madeAt: boundValues.madeAt,
    })
    .from(boundValues)
    .leftJoin(follower, eq(follower.supersedesId, boundValues.id))
    .where(eq(boundValues.caseId, heldCase.id))
    .orderBy(asc(boundValues.madeAt), asc(boundValues.id));
}

export async function insertBoundValue(tx: Transaction, values: typeof boundValues.$inferInsert) {
  const [row] = await tx.db.insert(boundValues).values(values).returning({ id: boundValues.id });
  return row;
}

export type LengthSource = Awaited<ReturnType<typeof listLengthSources>>[number];

/** Readings by their records, each with its mark and figure. */
export async function listLengthSources(reader: Reader, ids: readonly string[]) {
  if (ids.length === 0) return [];
  return reader.db
    .select({
      id: measurements.id,
      quantity: measurements.quantity,
      valueMm: measurements.valueMm,
      standardUncertaintyMm: measurements.standardUncertaintyMm,
      markId: marks.id,
      markNumber: marks.number,
      fractographId: fractographs.id,
      figureNumber: fractographs.figureNumber,
    })
    .from(measurements)
    .innerJoin(markVersions, eq(markVersions.id, measurements.markVersionId))
    .innerJoin(marks, eq(marks.id, markVersions.markId))
    .innerJoin(calibrationBindings, eq(calibrationBindings.id, measurements.bindingId))
    .innerJoin(fractographs, eq(fractographs.id, calibrationBindings.fractographId))
    .where(inArray(measurements.id, [...ids]));
}

const constantColumns = {
  id: materialConstants.id,
  kind: materialConstants.kind,
  value: materialConstants.value,
  standardUncertainty: materialConstants.standardUncertainty,
  recordNumber: materialConstants.recordNumber,
  source: materialConstants.source,
  materialId: materials.id,
  materialName: materials.name,
};

export type ConstantOfCase = Awaited<ReturnType<typeof listConstantRows>>[number];

export async function listConstantRows(reader: Reader, ids: readonly string[]) {
  if (ids.length === 0) return [];
  return reader.db
    .select(constantColumns)
    .from(materialConstants)
    .innerJoin(materials, eq(materials.id, materialConstants.materialId))
    .where(inArray(materialConstants.id, [...ids]));
}

/** The record that stands in for a constant now: itself, or the last of those that superseded it. */
export async function findConstantNow(reader: Reader, id: string): Promise<ConstantOfCase | null> {
  const { rows } = await reader.db.execute<{ id: string }>(sql`
    with recursive later (id, step) as (
      select ${id}::uuid, 0
      union all
      select c.id, l.step + 1 from material_constants c join later l on c.supersedes_id = l.id
    )
    select id from later order by step desc limit 1`);
  const [now] = await listConstantRows(
    reader,
    rows.map((row) => row.id),
  );
  return now ?? null;
}

/** Why old values were kept though what they rest on changed, newest last. */
export async function listKeptReasons(reader: Reader, ids: readonly string[]) {
  if (ids.length === 0) return [];
  return reader.db
    .select({ recordId: staleness.recordId, reason: staleness.reason })
    .from(staleness)
    .where(and(inArray(staleness.recordId, [...ids]), eq(staleness.settlement, 'kept'), isNotNull(staleness.reason)))
    .orderBy(asc(staleness.settledAt));
}
