import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { BackgroundGiven } from '#shared/contracts/cases.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { caseBackground } from '../../../database/tables/cases.ts';
import { people } from '../../../database/tables/people.ts';

const columns = {
  id: caseBackground.id,
  statement: caseBackground.statement,
  standing: caseBackground.standing,
  source: caseBackground.source,
  givenOn: caseBackground.givenOn,
  madeBy: caseBackground.madeBy,
  madeByName: people.name,
  madeAt: caseBackground.madeAt,
  version: caseBackground.version,
};

/** Statements not taken back: known before told before assumed, each in the order they were given. */
export function listBackground(reader: Reader, caseId: string) {
  const standing = sql`array_position(array['known', 'told', 'assumed'], ${caseBackground.standing})`;
  return selectBackground(reader)
    .where(and(eq(caseBackground.caseId, caseId), isNull(caseBackground.takenBackAt)))
    .orderBy(standing, asc(caseBackground.givenOn), asc(caseBackground.id));
}

export async function findBackground(reader: Reader, caseId: string, id: string) {
  const [row] = await selectBackground(reader).where(
    and(eq(caseBackground.id, id), eq(caseBackground.caseId, caseId), isNull(caseBackground.takenBackAt)),
  );
  return row ?? null;
}

export async function insertBackground(tx: Transaction, values: typeof caseBackground.$inferInsert) {
  const [row] = await tx.db.insert(caseBackground).values(values).returning({ id: caseBackground.id });
  return row;
}

export async function updateBackground(tx: Transaction, id: string, values: BackgroundGiven | { takenBackAt: Date }) {
  await tx.db
    .update(caseBackground)
    .set({ ...values, version: sql`${caseBackground.version} + 1` })
    .where(eq(caseBackground.id, id));
}

function selectBackground(reader: Reader) {
  return reader.db.select(columns).from(caseBackground).innerJoin(people, eq(caseBackground.madeBy, people.id));
}
