import type { CalibrationReach } from '#shared/contracts/calibrations.ts';
import type { Reader } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { listDependents } from '../../../lineage/lineage.ts';
import { findSeenCase, nothingHere } from '../../../rights/open-case.ts';
import {
  findInstrument,
  findKeptCalibration,
  listCalibrationsInForce,
  listCasesBoundTo,
  listInstruments,
  listKeptCalibrations,
} from '../queries/calibrations.ts';

export { findInstrument, listInstruments, listKeptCalibrations };

/** @throws Problem not-found, for one that is not kept for an instrument */
export async function loadKeptCalibration(reader: Reader, id: string) {
  const row = await findKeptCalibration(reader, id);
  if (!row) throw nothingHere();
  return row;
}

/** Calibrations in force of an instrument at a setting that names the objective: "20×" in "compound 20×". */
export async function listCalibrationsOf(reader: Reader, instrumentId: string, objective: string) {
  const wanted = plain(objective);
  const rows = await listCalibrationsInForce(reader, instrumentId);
  return rows.filter((row) => plain(row.calibration.setting ?? '') === wanted);
}

function plain(setting: string): string {
  return setting.toLowerCase().replaceAll('x', '×').replace(/\s+/g, '');
}

/** What hangs on a calibration across cases: counts, and the cases the asker may know of. */
export async function findReach(context: Context, id: string): Promise<CalibrationReach> {
  const { calibration } = await loadKeptCalibration(context.reader, id);
  const dependents = await listDependents(context.reader, { kind: 'calibration', id: calibration.id });
  const count = (kind: string) => dependents.filter((each) => each.kind === kind).length;
  const bound = await listCasesBoundTo(context.reader, id);
  const seen = await Promise.all(bound.map(async (each) => ((await mayKnow(context, each.number)) ? each : null)));
  const cases = seen.filter((each) => each !== null).map(({ number, state }) => ({ number, state }));
  return {
    bindings: count('calibration binding'),
    lengths: count('measurement'),
    estimates: count('estimate'),
    boundValues: count('bound value'),
    cases,
    otherCases: bound.length - cases.length,
  };
}

/** An administrator knows of numbers and states; others of the cases they see. */
async function mayKnow(context: Context, number: Parameters<typeof findSeenCase>[2]): Promise<boolean> {
  if (context.person.roles.includes('administrator')) return true;
  return (await findSeenCase(context.reader, context.person, number)) !== null;
}
