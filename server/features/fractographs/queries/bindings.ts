import { and, desc, eq, inArray, isNull, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { calibrationBindings, calibrations } from '../../../database/tables/fractographs.ts';
import { people } from '../../../database/tables/people.ts';

export type BindingRow = Awaited<ReturnType<typeof listBindingsOf>>[number];

const newer = alias(calibrationBindings, 'newer');

function select(reader: Reader) {
  return reader.db
    .select({
      binding: calibrationBindings,
      calibration: calibrations,
      boundByName: people.name,
      inForce: sql<boolean>`${newer.id} is null`,
    })
    .from(calibrationBindings)
    .innerJoin(calibrations, eq(calibrations.id, calibrationBindings.calibrationId))
    .innerJoin(people, eq(people.id, calibrationBindings.boundBy))
    .leftJoin(newer, eq(newer.supersedesId, calibrationBindings.id));
}

/** Every binding of an image, newest first. */
export function listBindingsOf(reader: Reader, fractographId: string) {
  return select(reader)
    .where(eq(calibrationBindings.fractographId, fractographId))
    .orderBy(desc(calibrationBindings.boundAt), desc(calibrationBindings.id));
}

/** The binding in force of each image that has one. */
export function listBindingsInForce(reader: Reader, fractographIds: readonly string[]) {
  if (fractographIds.length === 0) return Promise.resolve([]);
  return select(reader).where(and(inArray(calibrationBindings.fractographId, [...fractographIds]), isNull(newer.id)));
}

export async function insertBinding(tx: Transaction, values: typeof calibrationBindings.$inferInsert) {
  const [row] = await tx.db.insert(calibrationBindings).values(values).returning();
  return row;
}
