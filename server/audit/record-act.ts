import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { desc, eq, sql } from 'drizzle-orm';
import { auditEntries } from '../database/tables/acts.ts';
import { caseAuthors } from '../database/tables/cases.ts';
import type { Transaction } from '../database/connection.ts';
import { actTable, type ActName, type ActRow } from './act-table.ts';

export type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json | undefined };

export type Act = {
  readonly act: ActName;
  /** The case it happened in; absent for acts of the laboratory. */
  readonly inCase?: { readonly id: string; readonly number: string };
  readonly objectId?: string;
  readonly before?: Json;
  readonly after?: Json;
  readonly reason?: string | null;
};

type Doer = { readonly id: string; readonly name: string } | null;

/**
 * Writes an act into the trail, in the transaction of the act itself: append-only, chained by SHA-256 (over the
 * RFC 8785 form) to the entry before it in the same case. Authors are noted and open screens are told on commit.
 */
export async function recordAct(tx: Transaction, doer: Doer, act: Act): Promise<void> {
  const chain = act.inCase?.id ?? 'laboratory';
  // Serialises the chain: two acts in one case cannot both follow the same entry.
  await tx.db.execute(sql`select pg_advisory_xact_lock(hashtextextended(${chain}, 0))`);
  const [last] = await tx.db
    .select({ hash: auditEntries.hash })
    .from(auditEntries)
    .where(eq(auditEntries.chain, chain))
    .orderBy(desc(auditEntries.id))
    .limit(1);
  const entry = {
    chain,
    caseId: act.inCase?.id ?? null,
    act: act.act,
    objectId: act.objectId ?? null,
    personId: doer?.id ?? null,
    personName: doer?.name ?? 'Hacklebook',
    at: tx.at,
    before: act.before ?? null,
    after: act.after ?? null,
    reason: act.reason ?? null,
    previousHash: last?.hash ?? '',
  };
  await tx.db.insert(auditEntries).values({ ...entry, hash: hashOfEntry(entry) });
  if (act.inCase) await tellAndNote(tx, doer, act, act.inCase);
}

/** The hash an entry carries: SHA-256 of its canonical form, the previous hash included. */
export function hashOfEntry(entry: { at: Date } & Record<string, unknown>): string {
  const text = canonicalize({ ...entry, at: entry.at.toISOString() });
  return createHash('sha256')
    .update(text ?? '')
    .digest('hex');
}

async function tellAndNote(tx: Transaction, doer: Doer, act: Act, inCase: { id: string; number: string }) {
  const row: ActRow = actTable[act.act];
  if (row.authorship && doer) {
    await tx.db
      .insert(caseAuthors)
      .values({ caseId: inCase.id, personId: doer.id, firstAct: act.act, at: tx.at })
      .onConflictDoNothing();
  }
  const news = { number: inCase.number, act: act.act, objectId: act.objectId ?? null, by: doer?.id ?? null };
  await tx.db.execute(sql`select pg_notify('hb_case', ${JSON.stringify(news)})`);
}
