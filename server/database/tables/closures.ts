import { index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { signatureMeanings } from '../../../shared/vocabulary/signatures.ts';
import { id, instant } from '../columns.ts';
import { cases } from './cases.ts';
import { findingsVersions } from './findings.ts';
import { people } from './people.ts';

/** One round of review: sent, and then sent back with reasons or ended by an approval. */
export const reviews = pgTable(
  'reviews',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    round: integer().notNull(),
    findingsVersionId: uuid()
      .notNull()
      .references(() => findingsVersions.id),
    sentBy: uuid()
      .notNull()
      .references(() => people.id),
    sentAt: instant().notNull(),
    outcome: text({ enum: ['sent back', 'approved'] }),
    reasons: text(),
    endedBy: uuid().references(() => people.id),
    endedAt: instant(),
  },
  (t) => [unique('reviews_round').on(t.caseId, t.round)],
);

/** A readiness note accepted by a manager, with the reason. */
export const acceptedNotes = pgTable(
  'accepted_notes',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    note: text().notNull(),
    reason: text().notNull(),
    acceptedBy: uuid()
      .notNull()
      .references(() => people.id),
    acceptedAt: instant().notNull(),
  },
  (t) => [index().on(t.caseId)],
);

/** A record: a person's signature on exactly the content whose SHA-256 it carries (RFC 8785 form). */
export const signatures = pgTable(
  'signatures',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    reviewId: uuid()
      .notNull()
      .references(() => reviews.id),
    personId: uuid()
      .notNull()
      .references(() => people.id),
    printedName: text().notNull(),
    meaning: text({ enum: signatureMeanings }).notNull(),
    contentHash: text().notNull(),
    proof: text({ enum: ['password again'] }).notNull(),
    signedAt: instant().notNull(),
    zone: text().notNull(),
  },
  (t) => [index().on(t.caseId)],
);

/** A record: the signed freezing of a case. */
export const closures = pgTable(
  'closures',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .unique()
      .references(() => cases.id),
    sealNumber: text().notNull().unique(),
    /** Parts of the case with their hashes, RFC 8785. */
    manifest: jsonb().notNull(),
    rootHash: text().notNull(),
    previousRootHash: text().notNull(),
    closedBy: uuid()
      .notNull()
      .references(() => people.id),
    closedAt: instant().notNull(),
  },
  (t) => [index().on(t.closedAt)],
);
