import { and, eq } from 'drizzle-orm';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { organisations } from '../../../database/tables/people.ts';

export type OrganisationRow = typeof organisations.$inferSelect;

export function listOrganisations(reader: Reader): Promise<OrganisationRow[]> {
  return reader.db.select().from(organisations).orderBy(organisations.name);
}

export async function findOrganisation(reader: Reader, id: string): Promise<OrganisationRow | null> {
  const [row] = await reader.db.select().from(organisations).where(eq(organisations.id, id));
  return row ?? null;
}

/** Renames the organisation if it still is of the version seen; null when it is not. */
export async function renameOrganisation(tx: Transaction, seen: { id: string; version: number }, name: string) {
  const [row] = await tx.db
    .update(organisations)
    .set({ name, version: seen.version + 1 })
    .where(and(eq(organisations.id, seen.id), eq(organisations.version, seen.version)))
    .returning();
  return row ?? null;
}
