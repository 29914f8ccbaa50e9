import { bigint, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { instant } from '../columns.ts';
import { lineageKinds } from '../../../shared/vocabulary/lineage-kinds.ts';

/** Who did what, when and why: append-only, each entry carrying the hash of the one before it in its chain. */
export const auditEntries = pgTable(
  'audit_entries',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    /** The case's id, or 'laboratory' for acts outside a case. */
    chain: text().notNull(),
    caseId: uuid(),
    act: text().notNull(),
    objectId: text(),
    personId: uuid(),
    personName: text().notNull(),
    at: instant().notNull(),
    before: jsonb(),
    after: jsonb(),
    reason: text(),
    previousHash: text().notNull(),
    hash: text().notNull(),
  },
  (t) => [index().on(t.chain, t.id.desc()), index().on(t.at), index().on(t.objectId)],
);

/** Acts already done, by the id the client gave them, so that a retry after a lost answer does nothing twice. */
export const doneActs = pgTable(
  'done_acts',
  { actId: uuid().notNull(), personId: uuid().notNull(), at: instant().notNull() },
  (t) => [primaryKey({ columns: [t.actId, t.personId] })],
);

/** `to` was made from `from`. One table answers where a number comes from and what hangs on it. */
export const lineage = pgTable(
  'lineage',
  {
    fromKind: text({ enum: lineageKinds }).notNull(),
    fromId: uuid().notNull(),
    toKind: text({ enum: lineageKinds }).notNull(),
    toId: uuid().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.fromId, t.toId, t.fromKind, t.toKind] }),
    index('lineage_up_idx').on(t.toId, t.fromId, t.fromKind, t.toKind),
  ],
);

/** A record that rests on something since replaced: cause, time, and how a person settled it. */
export const staleness = pgTable(
  'staleness',
  {
    recordKind: text({ enum: lineageKinds }).notNull(),
    recordId: uuid().notNull(),
    causeKind: text({ enum: lineageKinds }).notNull(),
    /** The record that was replaced. */
    causeId: uuid().notNull(),
    /** What replaced it; absent when it was withdrawn. */
    replacedById: uuid(),
    caseId: uuid(),
    why: text().notNull(),
    since: instant().notNull(),
    settledAt: instant(),
    settledBy: uuid(),
    settlement: text({ enum: ['taken', 'kept'] }),
    reason: text(),
  },
  (t) => [
    primaryKey({ columns: [t.recordId, t.causeId] }),
    index('staleness_case_idx').on(t.caseId),
    index('staleness_cause_idx').on(t.causeId),
  ],
);

export const counters = pgTable('counters', {
  name: text().primaryKey(),
  value: bigint({ mode: 'number' }).notNull(),
});
