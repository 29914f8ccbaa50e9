import { boolean, doublePrecision, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { certainties } from '../../../shared/vocabulary/certainties.ts';
import { markKinds } from '../../../shared/vocabulary/mark-kinds.ts';
import { mirrorBoundaries } from '../../../shared/vocabulary/mirror-boundaries.ts';
import { measuredQuantities } from '../../../shared/vocabulary/measured-quantities.ts';
import { originCodes } from '../../../shared/vocabulary/origin-codes.ts';
import { id, instant } from '../columns.ts';
import { cases } from './cases.ts';
import { calibrationBindings, fractographs } from './fractographs.ts';
import { people } from './people.ts';

/** One drawn observation; what it looks like is in its versions. */
export const marks = pgTable(
  'marks',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    fractographId: uuid()
      .notNull()
      .references(() => fractographs.id),
    /** m7, through the case. */
    number: integer().notNull(),
    kind: text({ enum: markKinds }).notNull(),
  },
  (t) => [unique('marks_number').on(t.caseId, t.number), index().on(t.fractographId)],
);

/** A record: the mark as it stood from this act until the next. Geometry in image pixels. */
export const markVersions = pgTable(
  'mark_versions',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    markId: uuid()
      .notNull()
      .references(() => marks.id),
    version: integer().notNull(),
    geometry: jsonb().notNull(),
    certainty: text({ enum: certainties }).notNull(),
    boundary: text({ enum: mirrorBoundaries }),
    originCode: text({ enum: originCodes }),
    note: text().notNull().default(''),
    removed: boolean().notNull().default(false),
    supersedesId: uuid(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [unique('mark_versions_version').on(t.markId, t.version), index().on(t.caseId)],
);

/** A record: a length read from one mark version on one calibration binding. */
export const measurements = pgTable(
  'measurements',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    quantity: text({ enum: measuredQuantities }).notNull(),
    markVersionId: uuid()
      .notNull()
      .references(() => markVersions.id),
    /** The origin mark it was read from, as it stood; absent for what is read from the mark alone. */
    originVersionId: uuid().references(() => markVersions.id),
    bindingId: uuid()
      .notNull()
      .references(() => calibrationBindings.id),
    valuePx: doublePrecision().notNull(),
    valueMm: doublePrecision().notNull(),
    standardUncertaintyMm: doublePrecision().notNull(),
    readBy: uuid()
      .notNull()
      .references(() => people.id),
    readAt: instant().notNull(),
  },
  (t) => [
    unique('measurements_once').on(t.markVersionId, t.bindingId, t.quantity, t.originVersionId).nullsNotDistinct(),
    index().on(t.caseId),
  ],
);
