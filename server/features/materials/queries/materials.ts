import { asc, eq, sql } from 'drizzle-orm';
import type { MaterialEntered } from '#shared/contracts/materials.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { materials } from '../../../database/tables/materials.ts';

const inForce = sql<number>`(select count(distinct k.kind)::int from material_constants k
  where k.material_id = "materials"."id")`;

export function selectMaterials(reader: Reader) {
  const { id, name, family, route, grainSizeUm, note, version } = materials;
  return reader.db
    .select({ id, name, family, route, grainSizeUm, note, version, constantsInForce: inForce })
    .from(materials)
    .orderBy(asc(materials.name));
}

export async function findMaterial(reader: Reader, id: string) {
  const [row] = await selectMaterials(reader).where(eq(materials.id, id));
  return row ?? null;
}

/** Locks the material, so that two records of one constant are made one after the other. */
export async function lockMaterial(tx: Transaction, id: string) {
  await tx.db.select({ id: materials.id }).from(materials).where(eq(materials.id, id)).for('update');
  return findMaterial(tx, id);
}

export async function insertMaterial(tx: Transaction, entered: MaterialEntered) {
  const [row] = await tx.db
    .insert(materials)
    .values({ ...entered, madeAt: tx.at })
    .returning({ id: materials.id });
  return row;
}

export async function updateMaterial(tx: Transaction, id: string, values: Partial<MaterialEntered>) {
  await tx.db
    .update(materials)
    .set({ ...values, version: sql`${materials.version} + 1` })
    .where(eq(materials.id, id));
}
