import { and, asc, desc, eq, lte } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { materialConstants } from '../../../database/tables/materials.ts';
import { people } from '../../../database/tables/people.ts';

const later = alias(materialConstants, 'later');

function selectConstants(reader: Reader) {
  return reader.db
    .select({ constant: materialConstants, madeByName: people.name, supersededById: later.id })
    .from(materialConstants)
    .innerJoin(people, eq(materialConstants.madeBy, people.id))
    .leftJoin(later, eq(later.supersedesId, materialConstants.id));
}

export type ConstantRow = Awaited<ReturnType<typeof listRecords>>[number];

/** Every record of a material, by kind, newest first; with `until`, those that held on that day or before. */
export function listRecords(reader: Reader, materialId: string, until?: string) {
  return selectConstants(reader)
    .where(
      and(
        eq(materialConstants.materialId, materialId),
        until === undefined ? undefined : lte(materialConstants.validFrom, until),
      ),
    )
    .orderBy(asc(materialConstants.kind), desc(materialConstants.recordNumber));
}

export async function findRecord(reader: Reader, id: string) {
  const [row] = await selectConstants(reader).where(eq(materialConstants.id, id));
  return row ?? null;
}

export async function insertConstant(tx: Transaction, values: typeof materialConstants.$inferInsert) {
  const [row] = await tx.db.insert(materialConstants).values(values).returning({ id: materialConstants.id });
  return row;
}
