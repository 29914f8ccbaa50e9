import type { CalibrationEntered, CalibrationReplaced, InstrumentEntered } from '#shared/contracts/calibrations.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { markDependentsStale } from '../../../lineage/lineage.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import {
  findInstrument,
  findKeptCalibration,
  insertCalibration,
  insertInstrument,
  lockCalibration,
  nextCalibrationCode,
  type CalibrationValues,
} from '../queries/calibrations.ts';

const coverageFactor = 2;

/** Enters an instrument, for which calibrations may then be kept. */
export function enterInstrument(context: Context, entered: InstrumentEntered) {
  return context.inTransaction(async (tx) => {
    const instrument = await insertInstrument(tx, entered);
    await recordAct(tx, context.person, { act: 'instrument.entered', objectId: instrument.id, after: entered });
    return instrument;
  });
}

/** Keeps a calibration for an instrument, under the next code. @throws Problem not-valid without such an instrument */
export function recordCalibration(context: Context, entered: CalibrationEntered) {
  return context.inTransaction(async (tx) => {
    if (!(await findInstrument(tx, entered.instrumentId)))
      throw new Problem('not-valid', 'There is no such instrument.', { field: 'instrumentId' });
    const row = await insertCalibration(tx, await valuesOf(tx, context.person.id, entered.instrumentId, entered));
    await recordAct(tx, context.person, {
      act: 'calibration.recorded',
      objectId: row.id,
      after: { code: row.code, pixelSizeXUm: row.pixelSizeXUm, pixelSizeYUm: row.pixelSizeYUm, setting: row.setting },
    });
    return row;
  });
}

/**
 * Puts a new calibration in place of a kept one. Bindings and all that was read with them turn stale in the same act,
 * across cases and in closed ones too; nothing sealed is touched.
 * @returns the new calibration and how many records turned stale
 * @throws Problem wrong-state for one already replaced
 */
export function replaceCalibration(context: Context, id: string, entered: CalibrationReplaced) {
  return context.inTransaction(async (tx) => {
    await lockCalibration(tx, id, 'update');
    const old = await findKeptCalibration(tx, id);
    if (!old) throw nothingHere();
    if (old.replacedById)
      throw new Problem('wrong-state', `${old.calibration.code} was replaced by ${old.replacedByCode} already.`);
    const values = await valuesOf(tx, context.person.id, old.instrument.id, entered);
    const row = await insertCalibration(tx, { ...values, supersedesId: id, reason: entered.reason });
    const stale = await markDependentsStale(tx, {
      kind: 'calibration',
      oldId: id,
      newId: row.id,
      why: `${old.calibration.code} (${sized(old.calibration.pixelSizeXUm)}) was replaced by ${row.code} (${sized(row.pixelSizeXUm)}): ${entered.reason}`,
    });
    await recordAct(tx, context.person, {
      act: 'calibration.replaced',
      objectId: row.id,
      before: { id, code: old.calibration.code, pixelSizeXUm: old.calibration.pixelSizeXUm },
      after: { code: row.code, pixelSizeXUm: row.pixelSizeXUm, staleRecords: stale.length },
      reason: entered.reason,
    });
    return { calibration: row, staleRecords: stale.length };
  });
}

/** Keeps a calibration read off one image of a case; the act that needs it records it. */
export function keepImageCalibration(tx: Transaction, values: CalibrationValues & { caseId: string }) {
  return insertCalibration(tx, values);
}

/**
 * A kept calibration held against replacement until the end of the transaction.
 * @throws Problem not-found; wrong-state where it is replaced, naming the one in force
 */
export async function holdCalibrationInForce(tx: Transaction, id: string) {
  await lockCalibration(tx, id, 'share');
  const row = await findKeptCalibration(tx, id);
  if (!row) throw nothingHere();
  if (row.replacedById)
    throw new Problem(
      'wrong-state',
      `${row.calibration.code} was replaced by ${row.replacedByCode}; bind the image to that.`,
      {
        field: 'reading.calibrationId',
      },
    );
  return row;
}

async function valuesOf(
  tx: Transaction,
  personId: string,
  instrumentId: string,
  entered: Omit<CalibrationEntered, 'instrumentId'>,
): Promise<CalibrationValues> {
  const { setting, way, pixelSizeXUm, source, asFoundErrorPercent, validFrom } = entered;
  return {
    code: await nextCalibrationCode(tx),
    instrumentId,
    setting,
    way,
    pixelSizeXUm,
    pixelSizeYUm: entered.pixelSizeYUm ?? pixelSizeXUm,
    relativeUncertainty: entered.expandedUncertaintyPercent / 100 / coverageFactor,
    reading: { expandedUncertaintyPercent: entered.expandedUncertaintyPercent },
    source,
    asFoundErrorPercent,
    validFrom,
    madeBy: personId,
    madeAt: tx.at,
  };
}

function sized(pixelSizeUm: number): string {
  return `${Number(pixelSizeUm.toPrecision(4))} µm/px`;
}
