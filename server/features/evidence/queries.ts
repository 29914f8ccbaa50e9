import { aliasedTable, and, asc, eq, isNull, or } from 'drizzle-orm';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Face } from '#shared/vocabulary/pieces.ts';
import type { Reader, Transaction } from '../../database/connection.ts';
import { fragments, mates, parts } from '../../database/tables/evidence.ts';
import { materials } from '../../database/tables/materials.ts';
import { people } from '../../database/tables/people.ts';
import type { HeldFor } from '../../rights/open-case.ts';

type Held = HeldFor<CaseAct>;

export type PartRow = Awaited<ReturnType<typeof listPartRows>>[number];
export type FragmentRow = typeof fragments.$inferSelect;
export type MateRow = Awaited<ReturnType<typeof listMateRows>>[number];

const material = { id: materials.id, name: materials.name, family: materials.family };

export function listPartRows(reader: Reader, heldCase: Held) {
  return selectParts(reader).where(eq(parts.caseId, heldCase.id)).orderBy(asc(parts.madeAt), asc(parts.id));
}

export async function findPartRow(reader: Reader, heldCase: Held, id: string) {
  const [row] = await selectParts(reader).where(and(eq(parts.caseId, heldCase.id), eq(parts.id, id)));
  return row ?? null;
}

function selectParts(reader: Reader) {
  return reader.db
    .select({ part: parts, material })
    .from(parts)
    .leftJoin(materials, eq(parts.materialId, materials.id));
}

export async function hasMaterial(reader: Reader, id: string): Promise<boolean> {
  const rows = await reader.db.select({ id: materials.id }).from(materials).where(eq(materials.id, id));
  return rows.length > 0;
}

export async function insertPart(tx: Transaction, values: typeof parts.$inferInsert): Promise<{ id: string }> {
  const [row] = await tx.db.insert(parts).values(values).returning({ id: parts.id });
  return row;
}

export async function updatePart(tx: Transaction, id: string, values: Partial<typeof parts.$inferInsert>) {
  await tx.db.update(parts).set(values).where(eq(parts.id, id));
}

export function listFragmentRows(reader: Reader, heldCase: Held) {
  return reader.db
    .select()
    .from(fragments)
    .where(eq(fragments.caseId, heldCase.id))
    .orderBy(asc(fragments.madeAt), asc(fragments.id));
}

export async function findFragmentRow(reader: Reader, heldCase: Held, id: string): Promise<FragmentRow | null> {
  const [row] = await reader.db
    .select()
    .from(fragments)
    .where(and(eq(fragments.caseId, heldCase.id), eq(fragments.id, id)));
  return row ?? null;
}

export async function insertFragment(tx: Transaction, values: typeof fragments.$inferInsert): Promise<FragmentRow> {
  const [row] = await tx.db.insert(fragments).values(values).returning();
  return row;
}

export async function updateFragment(
  tx: Transaction,
  id: string,
  values: Partial<typeof fragments.$inferInsert>,
): Promise<FragmentRow> {
  const [row] = await tx.db.update(fragments).set(values).where(eq(fragments.id, id)).returning();
  return row;
}

/** The pairs of a case that hold now. */
export function listMateRows(reader: Reader, heldCase: Held) {
  return selectMates(reader)
    .where(and(eq(mates.caseId, heldCase.id), isNull(mates.partedAt)))
    .orderBy(asc(mates.pairedAt), asc(mates.id));
}

/** A pair of the case, also one that was parted. */
export async function findMateRow(reader: Reader, heldCase: Held, id: string) {
  const [row] = await selectMates(reader).where(and(eq(mates.caseId, heldCase.id), eq(mates.id, id)));
  return row ?? null;
}

/** The pair that a face is in now, on whichever side. */
export async function findPairOfFace(reader: Reader, caseId: string, fragmentId: string, face: Face) {
  const onOneSide = and(eq(mates.fragmentId, fragmentId), eq(mates.face, face));
  const onTheOther = and(eq(mates.mateFragmentId, fragmentId), eq(mates.mateFace, face));
  const [row] = await selectMates(reader).where(
    and(eq(mates.caseId, caseId), isNull(mates.partedAt), or(onOneSide, onTheOther)),
  );
  return row ?? null;
}

function selectMates(reader: Reader) {
  const one = aliasedTable(fragments, 'one');
  const other = aliasedTable(fragments, 'other');
  return reader.db
    .select({ mate: mates, oneCode: one.code, otherCode: other.code, pairedBy: { id: people.id, name: people.name } })
    .from(mates)
    .innerJoin(one, eq(mates.fragmentId, one.id))
    .innerJoin(other, eq(mates.mateFragmentId, other.id))
    .innerJoin(people, eq(mates.pairedBy, people.id));
}

export async function insertMate(tx: Transaction, values: typeof mates.$inferInsert): Promise<{ id: string }> {
  const [row] = await tx.db.insert(mates).values(values).returning({ id: mates.id });
  return row;
}

export async function updateMate(tx: Transaction, id: string, values: Partial<typeof mates.$inferInsert>) {
  await tx.db.update(mates).set(values).where(eq(mates.id, id));
}
