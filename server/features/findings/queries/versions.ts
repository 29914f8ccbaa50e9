import { and, desc, eq } from 'drizzle-orm';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { findingsVersions } from '../../../database/tables/findings.ts';
import { people } from '../../../database/tables/people.ts';
import type { HeldCase } from './bound-values.ts';

const lineColumns = {
  id: findingsVersions.id,
  number: findingsVersions.number,
  name: findingsVersions.name,
  contentHash: findingsVersions.contentHash,
  madeBy: findingsVersions.madeBy,
  madeByName: people.name,
  madeAt: findingsVersions.madeAt,
};

export type VersionRow = Awaited<ReturnType<typeof listVersionRows>>[number];

/** The named versions of the text, newest first. */
export function listVersionRows(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select(lineColumns)
    .from(findingsVersions)
    .innerJoin(people, eq(people.id, findingsVersions.madeBy))
    .where(eq(findingsVersions.caseId, heldCase.id))
    .orderBy(desc(findingsVersions.number));
}

export async function findVersionRow(reader: Reader, heldCase: HeldCase, number: number) {
  const [row] = await reader.db
    .select({ ...lineColumns, content: findingsVersions.content })
    .from(findingsVersions)
    .innerJoin(people, eq(people.id, findingsVersions.madeBy))
    .where(and(eq(findingsVersions.caseId, heldCase.id), eq(findingsVersions.number, number)));
  return row ?? null;
}

export async function insertVersion(tx: Transaction, values: typeof findingsVersions.$inferInsert) {
  const [row] = await tx.db.insert(findingsVersions).values(values).returning({ id: findingsVersions.id });
  return row;
}
