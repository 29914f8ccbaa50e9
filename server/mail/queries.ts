import { and, count, desc, eq, inArray, lt, sql } from 'drizzle-orm';
import type { Reader, Transaction } from '../database/connection.ts';
import { heldMails, outgoingMails } from '../database/tables/mail.ts';

export type OutgoingRow = typeof outgoingMails.$inferSelect;
export type HeldRow = typeof heldMails.$inferSelect;

export async function insertOutgoing(tx: Transaction, values: typeof outgoingMails.$inferInsert) {
  const [row] = await tx.db.insert(outgoingMails).values(values).returning({ id: outgoingMails.id });
  return row;
}

/** The mail, if it still waits and no other runner holds it; it stays ours until the transaction ends. */
export async function takeWaiting(tx: Transaction, id: string): Promise<OutgoingRow | null> {
  const [row] = await tx.db
    .select()
    .from(outgoingMails)
    .where(and(eq(outgoingMails.id, id), eq(outgoingMails.state, 'waiting')))
    .for('update', { skipLocked: true });
  return row ?? null;
}

export async function isWaiting(reader: Reader, id: string): Promise<boolean> {
  const rows = await reader.db
    .select({ id: outgoingMails.id })
    .from(outgoingMails)
    .where(and(eq(outgoingMails.id, id), eq(outgoingMails.state, 'waiting')));
  return rows.length > 0;
}

export async function markGone(tx: Transaction, id: string) {
  await tx.db
    .update(outgoingMails)
    .set({ state: 'gone', goneAt: tx.at, link: null, fault: null, tries: sql`${outgoingMails.tries} + 1` })
    .where(eq(outgoingMails.id, id));
}

export async function noteFault(tx: Transaction, id: string, noted: { fault: string; state: OutgoingRow['state'] }) {
  await tx.db
    .update(outgoingMails)
    .set({ ...noted, tries: sql`${outgoingMails.tries} + 1` })
    .where(eq(outgoingMails.id, id));
}

export async function insertHeld(tx: Transaction, values: typeof heldMails.$inferInsert) {
  await tx.db.insert(heldMails).values(values);
}

/** Puts a mail that came back into the outbox once more; null when it does not stand so. */
export async function waitAgain(tx: Transaction, id: string) {
  const [row] = await tx.db
    .update(outgoingMails)
    .set({ state: 'waiting', tries: 0, fault: null })
    .where(and(eq(outgoingMails.id, id), eq(outgoingMails.state, 'came back')))
    .returning({ toMail: outgoingMails.toMail, subject: outgoingMails.subject });
  return row ?? null;
}

export function listWaitingIds(reader: Reader) {
  return reader.db.select({ id: outgoingMails.id }).from(outgoingMails).where(eq(outgoingMails.state, 'waiting'));
}

/** Newest first; ids are ordered in time. */
export function listOutgoing(reader: Reader, page: { before?: string; most: number }) {
  return reader.db
    .select()
    .from(outgoingMails)
    .where(page.before ? lt(outgoingMails.id, page.before) : undefined)
    .orderBy(desc(outgoingMails.id))
    .limit(page.most);
}

export function listHeld(reader: Reader, page: { before?: string; most: number }) {
  return reader.db
    .select()
    .from(heldMails)
    .where(page.before ? lt(heldMails.id, page.before) : undefined)
    .orderBy(desc(heldMails.id))
    .limit(page.most);
}

export async function findHeld(reader: Reader, id: string): Promise<HeldRow | null> {
  const [row] = await reader.db.select().from(heldMails).where(eq(heldMails.id, id));
  return row ?? null;
}

export async function countCameBack(reader: Reader): Promise<number> {
  const [row] = await reader.db
    .select({ mails: count() })
    .from(outgoingMails)
    .where(eq(outgoingMails.state, 'came back'));
  return row.mails;
}

/** The last mail with that subject to each address, by address in small letters. */
export async function findLastMails(reader: Reader, subject: string, addresses: readonly string[]) {
  if (addresses.length === 0) return new Map<string, OutgoingRow>();
  const rows = await reader.db
    .select()
    .from(outgoingMails)
    .where(
      and(
        eq(outgoingMails.subject, subject),
        inArray(
          sql`lower(${outgoingMails.toMail})`,
          addresses.map((address) => address.toLowerCase()),
        ),
      ),
    )
    .orderBy(outgoingMails.id);
  return new Map(rows.map((row) => [row.toMail.toLowerCase(), row]));
}
