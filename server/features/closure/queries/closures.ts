import { asc, desc, eq, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { acceptedNotes, closures, reviews, signatures } from '../../../database/tables/closures.ts';
import { findingsVersions } from '../../../database/tables/findings.ts';
import { people } from '../../../database/tables/people.ts';
import type { HeldFor } from '../../../rights/open-case.ts';

export type HeldCase = HeldFor<CaseAct>;
export type SignatureRow = Awaited<ReturnType<typeof listSignatureRows>>[number];
export type RoundRow = Awaited<ReturnType<typeof listRoundRows>>[number];

const ender = alias(people, 'ender');

/** The rounds of review, newest first. */
export function listRoundRows(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({
      id: reviews.id,
      round: reviews.round,
      findingsVersion: findingsVersions.number,
      sentBy: reviews.sentBy,
      sentByName: people.name,
      sentAt: reviews.sentAt,
      outcome: reviews.outcome,
      reasons: reviews.reasons,
      endedBy: reviews.endedBy,
      endedByName: ender.name,
      endedAt: reviews.endedAt,
    })
    .from(reviews)
    .innerJoin(people, eq(people.id, reviews.sentBy))
    .innerJoin(findingsVersions, eq(findingsVersions.id, reviews.findingsVersionId))
    .leftJoin(ender, eq(ender.id, reviews.endedBy))
    .where(eq(reviews.caseId, heldCase.id))
    .orderBy(desc(reviews.round));
}

export async function insertRound(tx: Transaction, values: typeof reviews.$inferInsert) {
  const [row] = await tx.db.insert(reviews).values(values).returning({ id: reviews.id });
  return row;
}

type RoundEnd = Pick<typeof reviews.$inferInsert, 'outcome' | 'reasons' | 'endedBy' | 'endedAt'>;

export async function endRound(tx: Transaction, id: string, end: RoundEnd) {
  await tx.db.update(reviews).set(end).where(eq(reviews.id, id));
}

/** Every signature ever given in the case, in the order they were given. */
export function listSignatureRows(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({
      id: signatures.id,
      reviewId: signatures.reviewId,
      round: reviews.round,
      personId: signatures.personId,
      printedName: signatures.printedName,
      meaning: signatures.meaning,
      contentHash: signatures.contentHash,
      signedAt: signatures.signedAt,
      zone: signatures.zone,
    })
    .from(signatures)
    .innerJoin(reviews, eq(reviews.id, signatures.reviewId))
    .where(eq(signatures.caseId, heldCase.id))
    .orderBy(asc(signatures.signedAt), asc(signatures.id));
}

export async function insertSignature(tx: Transaction, values: typeof signatures.$inferInsert) {
  const [row] = await tx.db.insert(signatures).values(values).returning({ id: signatures.id });
  return row;
}

export function listAcceptedNotes(reader: Reader, heldCase: HeldCase) {
  return reader.db
    .select({
      note: acceptedNotes.note,
      reason: acceptedNotes.reason,
      acceptedBy: acceptedNotes.acceptedBy,
      acceptedByName: people.name,
      acceptedAt: acceptedNotes.acceptedAt,
    })
    .from(acceptedNotes)
    .innerJoin(people, eq(people.id, acceptedNotes.acceptedBy))
    .where(eq(acceptedNotes.caseId, heldCase.id))
    .orderBy(asc(acceptedNotes.acceptedAt));
}

export async function insertAcceptedNote(tx: Transaction, values: typeof acceptedNotes.$inferInsert) {
  const [row] = await tx.db.insert(acceptedNotes).values(values).returning({ id: acceptedNotes.id });
  return row;
}

export async function findClosureRow(reader: Reader, heldCase: HeldCase) {
  const [row] = await reader.db
    .select({
      id: closures.id,
      sealNumber: closures.sealNumber,
      manifest: closures.manifest,
      rootHash: closures.rootHash,
      previousRootHash: closures.previousRootHash,
      closedBy: closures.closedBy,
      closedByName: people.name,
      closedAt: closures.closedAt,
    })
    .from(closures)
    .innerJoin(people, eq(people.id, closures.closedBy))
    .where(eq(closures.caseId, heldCase.id));
  return row ?? null;
}

export async function insertClosure(tx: Transaction, values: typeof closures.$inferInsert) {
  const [row] = await tx.db.insert(closures).values(values).returning({ id: closures.id });
  return row;
}

/**
 * The root of the laboratory's last closure, the one that no other follows; empty before the first. Closures wait for
 * one another here until the transaction ends, so that two never follow the same one.
 */
export async function takeLastRootHash(tx: Transaction): Promise<string> {
  await tx.db.execute(sql`select pg_advisory_xact_lock(hashtextextended('closures', 0))`);
  const { rows } = await tx.db.execute<{ root_hash: string }>(sql`
    select c.root_hash from closures c
    where not exists (select 1 from closures n where n.previous_root_hash = c.root_hash)`);
  return rows.at(0)?.root_hash ?? '';
}

export async function hasRootHash(reader: Reader, rootHash: string): Promise<boolean> {
  const rows = await reader.db.select({ id: closures.id }).from(closures).where(eq(closures.rootHash, rootHash));
  return rows.length > 0;
}
