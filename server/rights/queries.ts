import { eq, getTableColumns, sql } from 'drizzle-orm';
import type { CaseNumber } from '#shared/contracts/ids.ts';
import type { Reader, Transaction } from '../database/connection.ts';
import { cases } from '../database/tables/cases.ts';

const { search: _search, ...columns } = getTableColumns(cases);

const rightsColumns = {
  ...columns,
  namedPersonIds: sql<
    string[]
  >`coalesce((select json_agg(p.person_id) from case_people p where p.case_id = ${cases.id}), '[]')`,
  authorIds: sql<
    string[]
  >`coalesce((select json_agg(a.person_id) from case_authors a where a.case_id = ${cases.id}), '[]')`,
};

export type CaseRow = NonNullable<Awaited<ReturnType<typeof findCaseRow>>>;

/** The case row with what rights need. Only the rights engine calls it: elsewhere a case is had through openCase. */
export async function findCaseRow(reader: Reader, number: CaseNumber) {
  const [row] = await reader.db.select(rightsColumns).from(cases).where(eq(cases.number, number));
  return row ?? null;
}

export async function lockCaseRow(tx: Transaction, id: string) {
  await tx.db.select({ id: cases.id }).from(cases).where(eq(cases.id, id)).for('update');
  const [row] = await tx.db.select(rightsColumns).from(cases).where(eq(cases.id, id));
  return row ?? null;
}
