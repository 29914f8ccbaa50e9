import { date, doublePrecision, index, integer, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { constantKinds, materialFamilies, sourceStandings } from '../../../shared/vocabulary/constant-kinds.ts';
import { id, instant } from '../columns.ts';
import { people } from './people.ts';

export const materials = pgTable('materials', {
  id: id(),
  name: text().notNull().unique(),
  family: text({ enum: materialFamilies }).notNull(),
  route: text(),
  grainSizeUm: doublePrecision(),
  note: text(),
  madeAt: instant().notNull(),
  version: integer().notNull().default(1),
});

/** A record: never changed. The one in force is the newest of its kind that nothing supersedes. */
export const materialConstants = pgTable(
  'material_constants',
  {
    id: id(),
    materialId: uuid()
      .notNull()
      .references(() => materials.id),
    recordNumber: integer().notNull(),
    kind: text({ enum: constantKinds }).notNull(),
    /** In the unit of the kind (shared/vocabulary/constant-kinds.ts): MPa√m, GPa or 1. */
    value: doublePrecision().notNull(),
    standardUncertainty: doublePrecision().notNull(),
    enteredText: text().notNull(),
    enteredUnit: text().notNull(),
    source: text().notNull(),
    sourceStanding: text({ enum: sourceStandings }).notNull(),
    condition: text(),
    validFrom: date({ mode: 'string' }).notNull(),
    supersedesId: uuid(),
    reason: text(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.materialId, t.kind), index().on(t.supersedesId)],
);
