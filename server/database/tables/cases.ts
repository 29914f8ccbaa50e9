import { type SQL, sql } from 'drizzle-orm';
import { boolean, date, index, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { caseKinds, caseStates, standings, urgencies } from '../../../shared/vocabulary/case-states.ts';
import { id, instant, tsvector } from '../columns.ts';
import { materials } from './materials.ts';
import { organisations, people } from './people.ts';

export const cases = pgTable(
  'cases',
  {
    id: id(),
    number: text().notNull().unique(),
    title: text().notNull(),
    /** What happened, in one or two sentences. */
    summary: text().notNull().default(''),
    kind: text({ enum: caseKinds }).notNull(),
    state: text({ enum: caseStates }).notNull(),
    holdReason: text(),
    holdUntil: date({ mode: 'string' }),
    heldSince: instant(),
    withdrawnReason: text(),
    urgency: text({ enum: urgencies }).notNull(),
    organisationId: uuid()
      .notNull()
      .references(() => organisations.id),
    materialId: uuid().references(() => materials.id),
    assignedTo: uuid().references(() => people.id),
    restricted: boolean().notNull().default(false),
    holdForLitigation: boolean().notNull().default(false),
    scope: text().notNull().default(''),
    receivedAt: instant().notNull(),
    stateSince: instant().notNull(),
    closedAt: instant(),
    version: integer().notNull().default(1),
    search: tsvector().generatedAlwaysAs(
      (): SQL => sql`to_tsvector('simple', ${cases.number} || ' ' || ${cases.title} || ' ' || ${cases.summary})`,
    ),
  },
  (t) => [
    index('cases_search_idx').using('gin', t.search),
    index().on(t.receivedAt.desc(), t.id),
    index().on(t.state, t.receivedAt.desc()),
    index().on(t.organisationId, t.receivedAt.desc()),
    index().on(t.assignedTo, t.receivedAt.desc()),
    index().on(t.materialId),
    // The order of numbers: by year, then by the place in it, which may outgrow four digits.
    index('cases_number_order_idx').on(sql`(substr(${t.number}, 4, 4) || lpad(substr(${t.number}, 9), 8, '0'))`),
    index('cases_title_order_idx').on(t.title, t.id),
  ],
);

/** People named to see a restricted case. */
export const casePeople = pgTable(
  'case_people',
  {
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    personId: uuid()
      .notNull()
      .references(() => people.id),
    addedAt: instant().notNull(),
  },
  (t) => [primaryKey({ columns: [t.caseId, t.personId] })],
);

/** Anyone with a kept act on what the signature vouches for; such a person may not approve. */
export const caseAuthors = pgTable(
  'case_authors',
  {
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    personId: uuid()
      .notNull()
      .references(() => people.id),
    firstAct: text().notNull(),
    at: instant().notNull(),
  },
  (t) => [primaryKey({ columns: [t.caseId, t.personId] })],
);

/** The agreed questions as one set a version: a record, so that the wording once agreed stays readable. */
export const caseQuestions = pgTable(
  'case_questions',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    version: integer().notNull(),
    questions: jsonb().$type<{ key: string; text: string }[]>().notNull(),
    besideScope: text().notNull().default(''),
    reason: text(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.caseId, t.version)],
);

export const caseBackground = pgTable(
  'case_background',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    statement: text().notNull(),
    standing: text({ enum: standings }).notNull(),
    source: text().notNull(),
    givenOn: date({ mode: 'string' }).notNull(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
    takenBackAt: instant(),
    version: integer().notNull().default(1),
  },
  (t) => [index().on(t.caseId)],
);
