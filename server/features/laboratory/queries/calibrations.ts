import { and, asc, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { CaseNumber } from '#shared/contracts/ids.ts';
import type { CaseState } from '#shared/vocabulary/case-states.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { counters } from '../../../database/tables/acts.ts';
import { calibrationBindings, calibrations, instruments } from '../../../database/tables/fractographs.ts';
import { cases } from '../../../database/tables/cases.ts';
import { people } from '../../../database/tables/people.ts';

export type CalibrationValues = typeof calibrations.$inferInsert;
export type CalibrationRow = Awaited<ReturnType<typeof listKeptCalibrations>>[number];
export type InstrumentRow = typeof instruments.$inferSelect;

const newer = alias(calibrations, 'newer');

/** Calibrations kept for instruments, in force and replaced ones, by instrument and code. */
export function listKeptCalibrations(reader: Reader) {
  return selectKept(reader).orderBy(asc(instruments.name), asc(calibrations.code));
}

export async function findKeptCalibration(reader: Reader, id: string) {
  const [row] = await selectKept(reader, eq(calibrations.id, id));
  return row ?? null;
}

export function listCalibrationsInForce(reader: Reader, instrumentId: string) {
  return selectKept(reader, and(eq(calibrations.instrumentId, instrumentId), isNull(newer.id)));
}

function selectKept(reader: Reader, condition?: ReturnType<typeof and>) {
  return reader.db
    .select({
      calibration: calibrations,
      instrument: instruments,
      madeByName: people.name,
      replacedById: newer.id,
      replacedByCode: newer.code,
      replacedFrom: newer.validFrom,
    })
    .from(calibrations)
    .innerJoin(instruments, eq(instruments.id, calibrations.instrumentId))
    .innerJoin(people, eq(people.id, calibrations.madeBy))
    .leftJoin(newer, eq(newer.supersedesId, calibrations.id))
    .where(and(isNotNull(calibrations.code), condition));
}

/** Locks a calibration, so that it is not replaced while an image is being bound to it, or the other way round. */
export async function lockCalibration(tx: Transaction, id: string, strength: 'share' | 'update'): Promise<boolean> {
  const rows = await tx.db
    .select({ id: calibrations.id })
    .from(calibrations)
    .where(eq(calibrations.id, id))
    .for(strength);
  return rows.length > 0;
}

export async function insertCalibration(tx: Transaction, values: CalibrationValues) {
  const [row] = await tx.db.insert(calibrations).values(values).returning();
  return row;
}

/** The next code, CAL-07, without gap: a calibration that comes to nothing gives its number back. */
export async function nextCalibrationCode(tx: Transaction): Promise<string> {
  const [row] = await tx.db
    .insert(counters)
    .values({ name: 'calibration', value: 1 })
    .onConflictDoUpdate({ target: counters.name, set: { value: sql`${counters.value} + 1` } })
    .returning({ value: counters.value });
  return `CAL-${String(row.value).padStart(2, '0')}`;
}

export function listInstruments(reader: Reader) {
  return reader.db.select().from(instruments).orderBy(instruments.name);
}

export async function findInstrument(reader: Reader, id: string) {
  const [row] = await reader.db.select().from(instruments).where(eq(instruments.id, id));
  return row ?? null;
}

export async function insertInstrument(tx: Transaction, values: typeof instruments.$inferInsert) {
  const [row] = await tx.db.insert(instruments).values(values).returning();
  return row;
}

/** The cases whose images are bound to a calibration, newest first. */
export function listCasesBoundTo(
  reader: Reader,
  calibrationId: string,
): Promise<{ number: CaseNumber; state: CaseState }[]> {
  return reader.db
    .selectDistinct({ number: sql<CaseNumber>`${cases.number}`, state: cases.state, receivedAt: cases.receivedAt })
    .from(calibrationBindings)
    .innerJoin(cases, eq(cases.id, calibrationBindings.caseId))
    .where(eq(calibrationBindings.calibrationId, calibrationId))
    .orderBy(desc(cases.receivedAt));
}
