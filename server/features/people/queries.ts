import { eq, sql } from 'drizzle-orm';
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
