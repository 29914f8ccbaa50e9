import { and, count, eq, gt, isNull } from 'drizzle-orm';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { oneTimeLinks } from '../../../database/tables/people.ts';

export type LinkPurpose = typeof oneTimeLinks.$inferSelect.purpose;
export type OpenInvitation = { personId: string; madeAt: Date; endsAt: Date };

const isUnspent = and(isNull(oneTimeLinks.usedAt), isNull(oneTimeLinks.takenBackAt));

export async function insertLink(tx: Transaction, values: typeof oneTimeLinks.$inferInsert) {
  await tx.db.insert(oneTimeLinks).values(values);
}

/** Whose link it is, if it may still be used at that instant. */
export async function findLinkOwner(reader: Reader, link: { tokenHash: string; purpose: LinkPurpose; at: Date }) {
  const [row] = await reader.db.select({ personId: oneTimeLinks.personId }).from(oneTimeLinks).where(isOpen(link));
  return row?.personId ?? null;
}

/** Spends the link; of several at once only one gets its owner's id, the others null. */
export async function spendLink(tx: Transaction, link: { tokenHash: string; purpose: LinkPurpose }) {
  const [row] = await tx.db
    .update(oneTimeLinks)
    .set({ usedAt: tx.at })
    .where(isOpen({ ...link, at: tx.at }))
    .returning({ personId: oneTimeLinks.personId });
  return row?.personId ?? null;
}

function isOpen(link: { tokenHash: string; purpose: LinkPurpose; at: Date }) {
  return and(
    eq(oneTimeLinks.tokenHash, link.tokenHash),
    eq(oneTimeLinks.purpose, link.purpose),
    gt(oneTimeLinks.endsAt, link.at),
    isUnspent,
  );
}

/** Takes back every link of the person not yet used. */
export async function takeLinksBack(tx: Transaction, personId: string) {
  await tx.db
    .update(oneTimeLinks)
    .set({ takenBackAt: tx.at })
    .where(and(eq(oneTimeLinks.personId, personId), isUnspent));
}

/** The newest invitation not used and not taken back, of each person who has one; it may have run out. */
export async function listOpenInvitations(reader: Reader): Promise<Map<string, OpenInvitation>> {
  const { personId, madeAt, endsAt } = oneTimeLinks;
  const rows = await reader.db
    .select({ personId, madeAt, endsAt })
    .from(oneTimeLinks)
    .where(and(eq(oneTimeLinks.purpose, 'invitation'), isUnspent))
    .orderBy(oneTimeLinks.id);
  return new Map(rows.map((row) => [row.personId, row]));
}

export async function countLinksSince(tx: Transaction, personId: string, purpose: LinkPurpose, since: Date) {
  const [row] = await tx.db
    .select({ links: count() })
    .from(oneTimeLinks)
    .where(and(eq(oneTimeLinks.personId, personId), eq(oneTimeLinks.purpose, purpose), gt(oneTimeLinks.madeAt, since)));
  return row.links;
}
