import { eq, sql, type SQL } from 'drizzle-orm';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { staleness } from '../../../database/tables/acts.ts';
import { casePeople, cases } from '../../../database/tables/cases.ts';
import { closures } from '../../../database/tables/closures.ts';
import { estimates } from '../../../database/tables/estimates.ts';
import { fractographs } from '../../../database/tables/fractographs.ts';
import { materials } from '../../../database/tables/materials.ts';
import { organisations, people } from '../../../database/tables/people.ts';

export type CaseValues = Partial<Omit<typeof cases.$inferInsert, 'id' | 'number'>>;

export async function insertCase(tx: Transaction, values: typeof cases.$inferInsert) {
  const [row] = await tx.db.insert(cases).values(values).returning({ id: cases.id, number: cases.number });
  return row;
}

/** Changes the row of a case that is locked already; every change is one version more. */
export async function updateCase(tx: Transaction, id: string, values: CaseValues): Promise<void> {
  await tx.db
    .update(cases)
    .set({ ...values, version: sql`${cases.version} + 1` })
    .where(eq(cases.id, id));
}

/** Names and counts that stand beside a case's own row. */
export async function loadCaseNames(reader: Reader, id: string) {
  const [row] = await reader.db
    .select({
      organisationName: organisations.name,
      materialName: materials.name,
      assignedName: people.name,
      sealNumber: closures.sealNumber,
      fractographs: countOf(fractographs, id),
      estimates: countOf(estimates, id),
      stale: staleOf(id, sql`'estimate'`, sql`estimates`),
      staleInText: staleOf(id, sql`'bound value'`, sql`bound_values`),
    })
    .from(cases)
    .innerJoin(organisations, eq(cases.organisationId, organisations.id))
    .leftJoin(materials, eq(cases.materialId, materials.id))
    .leftJoin(people, eq(cases.assignedTo, people.id))
    .leftJoin(closures, eq(closures.caseId, cases.id))
    .where(eq(cases.id, id));
  return row;
}

function countOf(table: typeof fractographs | typeof estimates, caseId: string) {
  return sql<number>`(select count(*)::int from ${table} where ${eq(table.caseId, caseId)})`;
}

export function listNamedPeople(reader: Reader, caseId: string) {
  return reader.db
    .select({ id: people.id, name: people.name })
    .from(casePeople)
    .innerJoin(people, eq(casePeople.personId, people.id))
    .where(eq(casePeople.caseId, caseId))
    .orderBy(people.name);
}

export async function replaceNamedPeople(tx: Transaction, caseId: string, personIds: readonly string[]) {
  await tx.db.delete(casePeople).where(eq(casePeople.caseId, caseId));
  if (personIds.length === 0) return;
  await tx.db.insert(casePeople).values(personIds.map((personId) => ({ caseId, personId, addedAt: tx.at })));
}

/** How many records of a kind are stale and neither settled nor replaced by a newer one. */
function staleOf(caseId: string, kind: SQL, table: SQL): SQL<number> {
  return sql<number>`(select count(distinct s.record_id)::int from ${staleness} s
    where s.case_id = ${caseId}::uuid and s.settled_at is null and s.record_kind = ${kind}
      and not exists (select from ${table} newer where newer.supersedes_id = s.record_id))`;
}
