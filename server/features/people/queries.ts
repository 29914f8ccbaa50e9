import { and, count, eq, sql } from 'drizzle-orm';
import type { Reader, Transaction } from '../../database/connection.ts';
import { organisations, people, personRoles } from '../../database/tables/people.ts';

export type PersonRow = NonNullable<Awaited<ReturnType<typeof findPersonById>>>;

const personColumns = {
  id: people.id,
  name: people.name,
  mail: people.mail,
  state: people.state,
  passwordHash: people.passwordHash,
  theme: people.theme,
  roomyRows: people.roomyRows,
  letterKeys: people.letterKeys,
  lastHereAt: people.lastHereAt,
  version: people.version,
  organisationId: people.organisationId,
  organisationName: organisations.name,
  organisationKind: organisations.kind,
  roles: sql<(typeof personRoles.$inferSelect.role)[]>`coalesce(
    (select json_agg(r.role order by r.role) from person_roles r where r.person_id = ${people.id}), '[]')`,
};

export async function findPersonById(reader: Reader, id: string) {
  const [row] = await selectPeople(reader).where(eq(people.id, id));
  return row ?? null;
}

export async function findPersonByMail(reader: Reader, mail: string) {
  const [row] = await selectPeople(reader).where(eq(sql`lower(${people.mail})`, mail.trim().toLowerCase()));
  return row ?? null;
}

export function listPeople(reader: Reader) {
  return selectPeople(reader).orderBy(organisations.name, people.name);
}

function selectPeople(reader: Reader) {
  return reader.db
    .select(personColumns)
    .from(people)
    .innerJoin(organisations, eq(people.organisationId, organisations.id));
}

/** The person's row, locked until the transaction ends. */
export async function lockPerson(tx: Transaction, id: string) {
  await tx.db.select({ id: people.id }).from(people).where(eq(people.id, id)).for('update');
  return findPersonById(tx, id);
}

type PersonChange = Partial<
  Pick<typeof people.$inferInsert, 'name' | 'mail' | 'organisationId' | 'state' | 'passwordHash'>
>;

/** Changes the row if it still is of the version seen. @returns whether it was */
export async function updatePerson(tx: Transaction, seen: { id: string; version: number }, change: PersonChange) {
  const rows = await tx.db
    .update(people)
    .set({ ...change, version: seen.version + 1 })
    .where(and(eq(people.id, seen.id), eq(people.version, seen.version)))
    .returning({ id: people.id });
  return rows.length > 0;
}

export async function updateSettings(
  tx: Transaction,
  id: string,
  settings: Partial<Pick<PersonRow, 'theme' | 'roomyRows' | 'letterKeys'>>,
) {
  await tx.db.update(people).set(settings).where(eq(people.id, id));
}

export async function replaceRoles(tx: Transaction, personId: string, roles: PersonRow['roles']) {
  await tx.db.delete(personRoles).where(eq(personRoles.personId, personId));
  await tx.db.insert(personRoles).values(roles.map((role) => ({ personId, role })));
}

/** How many open accounts hold the role of administrator; no other transaction changes that until this one ends. */
export async function countAdministrators(tx: Transaction): Promise<number> {
  await tx.db.execute(sql`select pg_advisory_xact_lock(hashtextextended('administrators', 0))`);
  const [row] = await tx.db
    .select({ administrators: count() })
    .from(personRoles)
    .innerJoin(people, eq(people.id, personRoles.personId))
    .where(and(eq(personRoles.role, 'administrator'), eq(people.state, 'open')));
  return row.administrators;
}

/** Tells every process that what this person may do has changed, so that open sockets ask again. */
export async function tellPersonChanged(tx: Transaction, id: string) {
  await tx.db.execute(sql`select pg_notify('hb_person', ${JSON.stringify({ id })})`);
}

export async function insertOrganisation(tx: Transaction, values: typeof organisations.$inferInsert) {
  const [row] = await tx.db.insert(organisations).values(values).returning();
  return row;
}

export async function insertPerson(
  tx: Transaction,
  values: typeof people.$inferInsert,
  roles: readonly (typeof personRoles.$inferInsert.role)[],
) {
  const [row] = await tx.db.insert(people).values(values).returning({ id: people.id });
  if (roles.length > 0) await tx.db.insert(personRoles).values(roles.map((role) => ({ personId: row.id, role })));
  return row;
}

export async function noteVisit(reader: Reader, id: string, at: Date) {
  await reader.db.update(people).set({ lastHereAt: at }).where(eq(people.id, id));
}
