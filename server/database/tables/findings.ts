import { bigint, boolean, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { bytea, id, instant } from '../columns.ts';
import { cases } from './cases.ts';
import { fractographs } from './fractographs.ts';
import { people } from './people.ts';

/** The shared text of a case, as the updates that made it, in the order they were committed. */
export const findingsUpdates = pgTable(
  'findings_updates',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    update: bytea().notNull(),
    madeBy: uuid().references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.caseId, t.id)],
);

/** A record: the text with every bound value resolved, as ProseMirror JSON. It is what is hashed, signed and printed. */
export const findingsVersions = pgTable(
  'findings_versions',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    number: integer().notNull(),
    name: text().notNull(),
    content: jsonb().notNull(),
    contentHash: text().notNull(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [unique('findings_versions_number').on(t.caseId, t.number)],
);

/** A record: a place in the text that shows a pinned record's value; the value itself is never in the text. */
export const boundValues = pgTable(
  'bound_values',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    sourceKind: text({ enum: ['estimate', 'measurement', 'material constant'] }).notNull(),
    sourceId: uuid().notNull(),
    /** Which value of the source, such as 'stress at the origin'. */
    quantity: text().notNull(),
    format: jsonb().notNull(),
    supersedesId: uuid(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.caseId), index().on(t.sourceId)],
);

/** A record: a view of a fractograph with chosen marks and a caption, as it stands in the text. */
export const figures = pgTable(
  'figures',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    fractographId: uuid()
      .notNull()
      .references(() => fractographs.id),
    /** Part of the image shown, in image px; absent for the whole. */
    framePx: jsonb().$type<{ x: number; y: number; width: number; height: number }>(),
    markIds: uuid().array().notNull(),
    caption: text().notNull(),
    scaleBar: boolean().notNull().default(true),
    supersedesId: uuid(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.caseId)],
);
