import { asc, eq, inArray, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { estimateInputs } from '../../../database/tables/estimates.ts';
import { calibrationBindings, calibrations, fractographs } from '../../../database/tables/fractographs.ts';
import { marks, markVersions, measurements } from '../../../database/tables/marks.ts';
import { materialConstants, materials } from '../../../database/tables/materials.ts';
import { people } from '../../../database/tables/people.ts';

export type InputRow = Awaited<ReturnType<typeof listInputRows>>[number];

/** The inputs of estimates, in the order in which they were kept. */
export async function listInputRows(reader: Reader, estimateIds: readonly string[]) {
  if (estimateIds.length === 0) return [];
  return reader.db
    .select()
    .from(estimateInputs)
    .where(inArray(estimateInputs.estimateId, [...estimateIds]))
    .orderBy(asc(estimateInputs.id));
}

const marker = alias(people, 'marker');
const binder = alias(people, 'binder');
const calibrator = alias(people, 'calibrator');
const originVersion = alias(markVersions, 'origin_version');
const originMark = alias(marks, 'origin_mark');

export type ReadingSource = Awaited<ReturnType<typeof listReadingSources>>[number];

/** Where measurements were read: mark, image, scale and calibration, with who made each and when. */
export async function listReadingSources(reader: Reader, measurementIds: readonly string[]) {
  if (measurementIds.length === 0) return [];
  return reader.db
    .select({
      id: measurements.id,
      quantity: measurements.quantity,
      markId: marks.id,
      markNumber: marks.number,
      markKind: marks.kind,
      markVersionId: markVersions.id,
      boundary: markVersions.boundary,
      markedBy: marker.name,
      markedAt: markVersions.madeAt,
      originVersionId: originVersion.id,
      originNumber: originMark.number,
      fractographId: fractographs.id,
      figureNumber: fractographs.figureNumber,
      bindingId: calibrationBindings.id,
      boundBy: binder.name,
      boundAt: calibrationBindings.boundAt,
      calibrationId: calibrations.id,
      calibrationCode: calibrations.code,
      calibrationSource: calibrations.source,
      calibratedBy: calibrator.name,
      validFrom: calibrations.validFrom,
      pixelSizeXUm: calibrations.pixelSizeXUm,
      relativeUncertainty: calibrations.relativeUncertainty,
    })
    .from(measurements)
    .innerJoin(markVersions, eq(markVersions.id, measurements.markVersionId))
    .innerJoin(marks, eq(marks.id, markVersions.markId))
    .innerJoin(marker, eq(marker.id, markVersions.madeBy))
    .leftJoin(originVersion, eq(originVersion.id, measurements.originVersionId))
    .leftJoin(originMark, eq(originMark.id, originVersion.markId))
    .innerJoin(calibrationBindings, eq(calibrationBindings.id, measurements.bindingId))
    .innerJoin(binder, eq(binder.id, calibrationBindings.boundBy))
    .innerJoin(fractographs, eq(fractographs.id, calibrationBindings.fractographId))
    .innerJoin(calibrations, eq(calibrations.id, calibrationBindings.calibrationId))
    .innerJoin(calibrator, eq(calibrator.id, calibrations.madeBy))
    .where(inArray(measurements.id, [...measurementIds]));
}

export type ConstantSource = Awaited<ReturnType<typeof listConstantSources>>[number];

/** Constants by their ids, with the material each is of. */
export async function listConstantSources(reader: Reader, constantIds: readonly string[]) {
  if (constantIds.length === 0) return [];
  return reader.db
    .select({
      id: materialConstants.id,
      kind: materialConstants.kind,
      recordNumber: materialConstants.recordNumber,
      value: materialConstants.value,
      standardUncertainty: materialConstants.standardUncertainty,
      source: materialConstants.source,
      sourceStanding: materialConstants.sourceStanding,
      materialId: materials.id,
      materialName: materials.name,
      madeBy: people.name,
      madeAt: materialConstants.madeAt,
    })
    .from(materialConstants)
    .innerJoin(materials, eq(materials.id, materialConstants.materialId))
    .innerJoin(people, eq(people.id, materialConstants.madeBy))
    .where(inArray(materialConstants.id, [...constantIds]));
}

/** The record of the constant in force now: itself, or the last of those that stand in for it. */
export async function findConstantInForce(reader: Reader, constantId: string) {
  const { rows } = await reader.db.execute<{ id: string }>(sql`
    with recursive later (id, step) as (
      select ${constantId}::uuid, 0
      union all
      select c.id, l.step + 1 from material_constants c join later l on c.supersedes_id = l.id
    )
    select id from later order by step desc limit 1`);
  const [inForce] = await listConstantSources(
    reader,
    rows.map((row) => row.id),
  );
  return inForce ?? null;
}

/** The scale that a binding has now: its own calibration, or the last of those that stand in for it. */
export async function findScaleInForce(reader: Reader, bindingId: string) {
  const { rows } = await reader.db.execute<{ id: string; step: number }>(sql`
    with recursive later (id, step) as (
      select calibration_id, 0 from calibration_bindings where id = ${bindingId}::uuid
      union all
      select c.id, l.step + 1 from calibrations c join later l on c.supersedes_id = l.id
    )
    select id, step from later order by step desc limit 1`);
  const [last] = rows;
  if (!last) return null;
  const [scale] = await reader.db
    .select({
      id: calibrations.id,
      code: calibrations.code,
      pixelSizeXUm: calibrations.pixelSizeXUm,
      pixelSizeYUm: calibrations.pixelSizeYUm,
      relativeUncertainty: calibrations.relativeUncertainty,
    })
    .from(calibrations)
    .where(eq(calibrations.id, last.id));
  return scale ? { ...scale, isReplaced: last.step > 0 } : null;
}

/** Holds the material of a constant until the act is done, so that no other record comes into force meanwhile. */
export async function holdMaterial(tx: Transaction, materialId: string): Promise<void> {
  await tx.db.select({ id: materials.id }).from(materials).where(eq(materials.id, materialId)).for('share');
}

/** Holds the calibration an image is bound to until the act is done, so that it is not replaced meanwhile. */
export async function holdCalibrationOf(tx: Transaction, bindingId: string): Promise<void> {
  const [bound] = await tx.db
    .select({ id: calibrationBindings.calibrationId })
    .from(calibrationBindings)
    .where(eq(calibrationBindings.id, bindingId));
  if (!bound) return;
  await tx.db.select({ id: calibrations.id }).from(calibrations).where(eq(calibrations.id, bound.id)).for('share');
}
