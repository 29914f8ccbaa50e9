import type { Request } from 'express';
import { sql } from 'drizzle-orm';
import type { Person } from '#shared/contracts/people.ts';
import { doneActs } from '../database/tables/acts.ts';
import type { Database, Reader, Transaction } from '../database/connection.ts';
import type { Storage } from '../storage/storage.ts';
import { Problem } from './problem.ts';

/** What this installation takes at most. */
export type Limits = { readonly largestFileBytes: number; readonly largestImagePx: number };

/** What a service works with: who asks, where to read, how to write. It knows no request, session or wall clock. */
export type Context = {
  readonly person: Person;
  readonly reader: Reader;
  readonly storage: Storage;
  readonly limits: Limits;
  /** The laboratory's zone, as "Europe/London": for showing and for what a signature says; instants are UTC. */
  readonly zone: string;
  /** Runs one act. With an act id from the client, a second run of the same act is refused as already done. */
  inTransaction<Done>(work: (tx: Transaction) => Promise<Done>): Promise<Done>;
  /** Writes what stands whatever becomes of the act itself: a counted try, a sign-in. It claims no act id. */
  besideAct<Done>(work: (tx: Transaction) => Promise<Done>): Promise<Done>;
};

/** The same for someone not signed in, or for the server's own jobs. */
export type VisitorContext = Omit<Context, 'person'> & { readonly person: Person | null };

export type ContextParts = {
  database: Database;
  storage: Storage;
  limits: Limits;
  zone?: string;
  /** Stands in for the database clock, in the demo and in tests. */
  clock?: () => Date;
  actId?: string | null;
};

/** Makes the context of one person's act or reading. */
export function contextFor(person: Person, parts: ContextParts): Context {
  return { ...visitorContext(parts, person), person };
}

/** Makes the context of a visitor or, with no person, of the server itself. */
export function visitorContext(parts: ContextParts, person: Person | null = null): VisitorContext {
  const run = <Done>(work: (tx: Transaction) => Promise<Done>, actId: string | null) =>
    parts.database.db.transaction(async (db) => {
      const at = parts.clock ? parts.clock() : await databaseNow({ db });
      const tx: Transaction = { db, at };
      if (actId && person) await claimAct(tx, actId, person.id);
      return work(tx);
    });
  return {
    person,
    reader: { db: parts.database.db },
    storage: parts.storage,
    limits: parts.limits,
    zone: parts.zone ?? 'UTC',
    inTransaction: (work) => run(work, parts.actId ?? null),
    besideAct: (work) => run(work, null),
  };
}

async function databaseNow(reader: Reader): Promise<Date> {
  const { rows } = await reader.db.execute<{ at: Date | string }>(sql`select now() as at`);
  return new Date(rows[0].at);
}

async function claimAct(tx: Transaction, actId: string, personId: string): Promise<void> {
  const claimed = await tx.db
    .insert(doneActs)
    .values({ actId, personId, at: tx.at })
    .onConflictDoNothing()
    .returning({ actId: doneActs.actId });
  if (claimed.length === 0) throw new Problem('already-done', 'This was done already; nothing was done twice.');
}

/** The signed-in person of a request, read afresh at every request by the session layer. */
export function personOf(request: Request): Person | null {
  return request.user ?? null;
}
