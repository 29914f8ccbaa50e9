import { and, asc, count, desc, eq, gt, gte, inArray, lt, or } from 'drizzle-orm';
import type { TrailQuery } from '#shared/contracts/laboratory.ts';
import type { Reader } from '../../database/connection.ts';
import { auditEntries } from '../../database/tables/acts.ts';
import { cases } from '../../database/tables/cases.ts';
import { organisations, people } from '../../database/tables/people.ts';

export type AuditRow = typeof auditEntries.$inferSelect;

const withCaseNumber = { entry: auditEntries, caseNumber: cases.number };

/** Entries of the trail, newest first. */
export function listTrail(reader: Reader, asked: TrailQuery, most: number) {
  return reader.db
    .select(withCaseNumber)
    .from(auditEntries)
    .leftJoin(cases, eq(cases.id, auditEntries.caseId))
    .where(
      and(
        asked.before ? lt(auditEntries.id, asked.before) : undefined,
        asked.personId ? eq(auditEntries.personId, asked.personId) : undefined,
        asked.act ? eq(auditEntries.act, asked.act) : undefined,
        asked.from ? gte(auditEntries.at, new Date(asked.from)) : undefined,
        asked.until ? lt(auditEntries.at, new Date(asked.until)) : undefined,
      ),
    )
    .orderBy(desc(auditEntries.id))
    .limit(most);
}

/** Entries in the order in which their chains are recomputed, after the one named. */
export function listChained(reader: Reader, after: { chain: string; id: number } | null, most: number) {
  return reader.db
    .select(withCaseNumber)
    .from(auditEntries)
    .leftJoin(cases, eq(cases.id, auditEntries.caseId))
    .where(
      after
        ? or(
            gt(auditEntries.chain, after.chain),
            and(eq(auditEntries.chain, after.chain), gt(auditEntries.id, after.id)),
          )
        : undefined,
    )
    .orderBy(asc(auditEntries.chain), asc(auditEntries.id))
    .limit(most);
}

export async function countTrail(reader: Reader): Promise<number> {
  const [row] = await reader.db.select({ entries: count() }).from(auditEntries);
  return row.entries;
}

/** The names of those people and organisations that acts of the laboratory were done to, by id. */
export async function namesOf(reader: Reader, ids: readonly string[]): Promise<Map<string, string>> {
  if (ids.length === 0) return new Map();
  const [persons, entered] = await Promise.all([
    reader.db
      .select({ id: people.id, name: people.name })
      .from(people)
      .where(inArray(people.id, [...ids])),
    reader.db
      .select({ id: organisations.id, name: organisations.name })
      .from(organisations)
      .where(inArray(organisations.id, [...ids])),
  ]);
  return new Map([...persons, ...entered].map(({ id, name }) => [id, name]));
}

export async function findLaboratoryName(reader: Reader): Promise<string | null> {
  const [row] = await reader.db
    .select({ name: organisations.name })
    .from(organisations)
    .where(eq(organisations.kind, 'laboratory'))
    .orderBy(organisations.id)
    .limit(1);
  return row?.name ?? null;
}

/** Kinds of acts that stand in the trail. */
export async function listActsDone(reader: Reader): Promise<string[]> {
  const rows = await reader.db.selectDistinct({ act: auditEntries.act }).from(auditEntries);
  return rows.map(({ act }) => act);
}
