import { and, asc, eq, getTableColumns, inArray, ne, sql } from 'drizzle-orm';
import type { CaseNumber, FractographId } from '#shared/contracts/ids.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { counters } from '../../../database/tables/acts.ts';
import { cases } from '../../../database/tables/cases.ts';
import { fragments } from '../../../database/tables/evidence.ts';
import { fractographs, instruments, keptFiles } from '../../../database/tables/fractographs.ts';
import { people } from '../../../database/tables/people.ts';
import type { HeldFor } from '../../../rights/open-case.ts';

export type FractographRow = Awaited<ReturnType<typeof listFractographRows>>[number];
export type FractographValues = typeof fractographs.$inferInsert;
export type FractographChange = Partial<Omit<FractographValues, 'id' | 'caseId' | 'sha256'>>;

const columns = {
  fractograph: getTableColumns(fractographs),
  broughtInByName: people.name,
  fragmentCode: fragments.code,
  instrumentName: instruments.name,
  /** Marks whose newest version is not removed. */
  markCount: sql<number>`(
    select count(*)::int from marks m where m.fractograph_id = ${fractographs.id} and exists (
      select 1 from mark_versions v where v.mark_id = m.id and not v.removed
        and v.version = (select max(w.version) from mark_versions w where w.mark_id = m.id)))`,
  sameBytesAs: sql<{ id: string; figureNumber: number }[]>`coalesce((
    select json_agg(json_build_object('id', o.id, 'figureNumber', o.figure_number) order by o.figure_number)
    from fractographs o
    where o.case_id = ${fractographs.caseId} and o.sha256 = ${fractographs.sha256} and o.id <> ${fractographs.id}), '[]')`,
  /** The first image of the face that this one was once against. */
  mateId: sql<string | null>`(
    select o.id from mates t join fractographs o on o.case_id = t.case_id and o.state = 'ready'
    where t.case_id = ${fractographs.caseId} and t.parted_at is null and (
      (t.fragment_id = ${fractographs.fragmentId} and t.face = ${fractographs.face}
        and o.fragment_id = t.mate_fragment_id and o.face = t.mate_face)
      or (t.mate_fragment_id = ${fractographs.fragmentId} and t.mate_face = ${fractographs.face}
        and o.fragment_id = t.fragment_id and o.face = t.face))
    order by (o.view is not distinct from ${fractographs.view}) desc, o.figure_number limit 1)`,
};

function select(reader: Reader) {
  return reader.db
    .select(columns)
    .from(fractographs)
    .innerJoin(people, eq(people.id, fractographs.broughtInBy))
    .leftJoin(fragments, eq(fragments.id, fractographs.fragmentId))
    .leftJoin(instruments, eq(instruments.id, fractographs.instrumentId));
}

export function listFractographRows(reader: Reader, heldCase: HeldFor<CaseAct>) {
  return select(reader).where(eq(fractographs.caseId, heldCase.id)).orderBy(asc(fractographs.figureNumber));
}

export async function findFractographRow(reader: Reader, heldCase: HeldFor<CaseAct>, id: FractographId) {
  const [row] = await select(reader).where(and(eq(fractographs.caseId, heldCase.id), eq(fractographs.id, id)));
  return row ?? null;
}

/** The plain row without what is joined to it: what serving a tile needs. */
export async function findBareFractograph(reader: Reader, heldCase: HeldFor<CaseAct>, id: FractographId) {
  const [row] = await reader.db
    .select()
    .from(fractographs)
    .where(and(eq(fractographs.caseId, heldCase.id), eq(fractographs.id, id)));
  return row ?? null;
}

/** The server's own work on a file reaches it by id, with the case it belongs to. */
export async function findForCutting(reader: Reader, id: string) {
  const [row] = await reader.db
    .select({ fractograph: getTableColumns(fractographs), number: sql<CaseNumber>`${cases.number}` })
    .from(fractographs)
    .innerJoin(cases, eq(cases.id, fractographs.caseId))
    .where(eq(fractographs.id, id));
  return row ?? null;
}

/** The next figure number of a case, without gap: an act that fails gives its number back. */
export async function nextFigureNumber(tx: Transaction, heldCase: HeldFor<CaseAct>): Promise<number> {
  const [row] = await tx.db
    .insert(counters)
    .values({ name: `figure ${heldCase.id}`, value: 1 })
    .onConflictDoUpdate({ target: counters.name, set: { value: sql`${counters.value} + 1` } })
    .returning({ value: counters.value });
  return row.value;
}

export async function findLargestFigureNumber(reader: Reader, heldCase: HeldFor<CaseAct>): Promise<number> {
  const [row] = await reader.db
    .select({ largest: sql<number>`coalesce(max(${fractographs.figureNumber}), 0)::int` })
    .from(fractographs)
    .where(eq(fractographs.caseId, heldCase.id));
  return row.largest;
}

export async function insertFractograph(tx: Transaction, values: FractographValues) {
  await tx.db
    .insert(keptFiles)
    .values({ sha256: values.sha256, bytes: values.bytes, keptAt: tx.at })
    .onConflictDoNothing();
  const [row] = await tx.db.insert(fractographs).values(values).returning({ id: fractographs.id });
  return row;
}

/** Changes the row where its version is still the one seen. @returns whether it was */
export async function changeFractograph(tx: Transaction, id: string, versionSeen: number, change: FractographChange) {
  const changed = await tx.db
    .update(fractographs)
    .set({ ...change, version: versionSeen + 1 })
    .where(and(eq(fractographs.id, id), eq(fractographs.version, versionSeen)))
    .returning({ id: fractographs.id });
  return changed.length > 0;
}

/** Notes how far the server's own work has come; the version a person saw stays good. */
export async function noteProgress(reader: Reader, id: string, noted: FractographChange): Promise<void> {
  await reader.db
    .update(fractographs)
    .set(noted)
    .where(and(eq(fractographs.id, id), inArray(fractographs.state, ['checking', 'cutting tiles'])));
}

/** Whether a piece belongs to the case. */
export async function hasFragment(reader: Reader, heldCase: HeldFor<CaseAct>, fragmentId: string): Promise<boolean> {
  const rows = await reader.db
    .select({ id: fragments.id })
    .from(fragments)
    .where(and(eq(fragments.id, fragmentId), eq(fragments.caseId, heldCase.id)));
  return rows.length > 0;
}

/** Holds everyone else off the bytes of one file until the transaction ends: who keeps them and who drops them take turns. */
export async function lockBytes(reader: Reader, sha256: string): Promise<void> {
  await reader.db.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`bytes ${sha256}`}, 0))`);
}

/** Runs work while the bytes of a file are locked. */
export function withBytesLocked<Done>(reader: Reader, sha256: string, work: (locked: Reader) => Promise<Done>) {
  return reader.db.transaction(async (db) => {
    await lockBytes({ db }, sha256);
    return work({ db });
  });
}

/** Rows that still need the bytes: all that are not refused, and refused ones brought in after `since`. */
export async function countUsesOfBytes(reader: Reader, sha256: string, since: Date | null): Promise<number> {
  const [row] = await reader.db
    .select({ uses: sql<number>`count(*)::int` })
    .from(fractographs)
    .where(
      and(
        eq(fractographs.sha256, sha256),
        since
          ? sql`(${ne(fractographs.state, 'refused')} or ${fractographs.broughtInAt} > ${since.toISOString()}::timestamptz)`
          : undefined,
      ),
    );
  return row.uses;
}
