import type { MeasuredQuantity } from '#shared/vocabulary/measured-quantities.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import type { Transaction } from '../../../database/connection.ts';
import { recordLineage } from '../../../lineage/lineage.ts';
import { findMeasurement, insertMeasurement, type HeldCase } from '../queries.ts';
import { readOne } from './readings.ts';

export type MeasurementTaken = {
  readonly id: string;
  readonly quantity: MeasuredQuantity;
  readonly valueMm: number;
  readonly standardUncertaintyMm: number;
  readonly mark: { id: string; number: number; fractographId: string; versionId: string };
  readonly boundary: 'inner' | 'outer' | 'branching' | 'not stated' | null;
  readonly bindingId: string;
};

/**
 * Finds or makes the record of a length: read from the mark version in force, the origin mark's where it is a radius,
 * and the scale in force, all of which it names as its sources. Call it inside the act that takes the length.
 * @throws Problem not-valid where the mark says no such length; not-ready while its image has no scale
 */
export async function readMeasurement(
  tx: Transaction,
  context: Context,
  heldCase: HeldCase,
  wanted: { markId: string; quantity: MeasuredQuantity },
): Promise<MeasurementTaken> {
  const read = await readOne(tx, heldCase, wanted);
  if (!read) throw new Problem('not-valid', `No mark says this ${wanted.quantity} now.`, { field: 'markId' });
  const { mark, origin, bindingId, reading } = read;
  const { valueMm, standardUncertaintyMm, valuePx, quantity } = reading;
  if (!bindingId || valueMm === null || standardUncertaintyMm === null) {
    throw new Problem('not-ready', `m${mark.number} stands on an uncalibrated image; give it its scale first.`, {
      field: 'markId',
      stillHolds: 'The mark keeps its place in pixels.',
    });
  }
  const from = { markVersionId: mark.versionId, originVersionId: origin?.versionId ?? null, bindingId, quantity };
  const taken = {
    quantity,
    mark: { id: mark.id, number: mark.number, fractographId: mark.fractographId, versionId: mark.versionId },
    boundary: mark.boundary,
    bindingId,
  };
  const found = await findMeasurement(tx, from);
  if (found)
    return { ...taken, id: found.id, valueMm: found.valueMm, standardUncertaintyMm: found.standardUncertaintyMm };
  const values = { valuePx, valueMm, standardUncertaintyMm };
  const made = await insertMeasurement(tx, {
    ...from,
    ...values,
    caseId: heldCase.id,
    readBy: context.person.id,
    readAt: tx.at,
  });
  await recordLineage(tx, { kind: 'measurement', id: made.id }, [
    { kind: 'mark version', id: mark.versionId },
    ...(origin ? [{ kind: 'mark version' as const, id: origin.versionId }] : []),
    { kind: 'calibration binding', id: bindingId },
  ]);
  await recordAct(tx, context.person, {
    act: 'measurement.read',
    inCase: heldCase,
    objectId: made.id,
    after: { mark: `m${mark.number}`, quantity, ...values },
  });
  return { ...taken, id: made.id, valueMm, standardUncertaintyMm };
}
