import { date, doublePrecision, index, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { faces, fragmentStatuses, fragmentWays, originLies } from '../../../shared/vocabulary/pieces.ts';
import { id, instant } from '../columns.ts';
import { cases } from './cases.ts';
import { materials } from './materials.ts';
import { people } from './people.ts';

/** What broke: one part or specimen of a case. */
export const parts = pgTable(
  'parts',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    description: text().notNull(),
    serial: text(),
    drawing: text(),
    maker: text(),
    materialId: uuid().references(() => materials.id),
    environment: text(),
    temperatureC: doublePrecision(),
    serviceTime: text(),
    madeAt: instant().notNull(),
    version: integer().notNull().default(1),
  },
  (t) => [index().on(t.caseId)],
);

export const fragments = pgTable(
  'fragments',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    partId: uuid()
      .notNull()
      .references(() => parts.id),
    /** The piece this one was made from; absent for a piece of the part as received. */
    parentId: uuid(),
    /** F1, F2, …; a piece that is not there is M1, M2, … */
    code: text().notNull(),
    description: text().notNull(),
    way: text({ enum: fragmentWays }).notNull(),
    status: text({ enum: fragmentStatuses }).notNull(),
    missingReason: text(),
    originLies: text({ enum: originLies }),
    massG: doublePrecision(),
    /** U (k = 2) of the mass, g. */
    massUncertaintyG: doublePrecision(),
    /** As it was typed: 6.412 kg ± 5 g. */
    massEntered: text(),
    place: text().notNull(),
    holder: text().notNull(),
    condition: text(),
    receivedOn: date({ mode: 'string' }),
    madeAt: instant().notNull(),
    version: integer().notNull().default(1),
  },
  (t) => [unique('fragments_code').on(t.caseId, t.code), index().on(t.partId)],
);

/** Two faces that were one before the break. */
export const mates = pgTable(
  'mates',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    fragmentId: uuid()
      .notNull()
      .references(() => fragments.id),
    face: text({ enum: faces }).notNull(),
    mateFragmentId: uuid()
      .notNull()
      .references(() => fragments.id),
    mateFace: text({ enum: faces }).notNull(),
    crack: text(),
    pairedBy: uuid()
      .notNull()
      .references(() => people.id),
    pairedAt: instant().notNull(),
    partedAt: instant(),
    version: integer().notNull().default(1),
  },
  (t) => [index().on(t.caseId)],
);
