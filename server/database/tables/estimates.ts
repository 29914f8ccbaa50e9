import { doublePrecision, index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { estimateLines } from '../../../shared/vocabulary/estimate-lines.ts';
import { mirrorBoundaries } from '../../../shared/vocabulary/mirror-boundaries.ts';
import { id, instant } from '../columns.ts';
import { cases } from './cases.ts';
import { people } from './people.ts';

/** A record: one reckoning of the stress at the origin, with method, inputs and interval. */
export const estimates = pgTable(
  'estimates',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    /** Estimate n, through the case. */
    number: integer().notNull(),
    line: text({ enum: estimateLines }).notNull(),
    method: text().notNull(),
    methodVersion: integer().notNull(),
    /** Stress at the origin, MPa. */
    stressMPa: doublePrecision('stress_mpa').notNull(),
    standardUncertaintyMPa: doublePrecision('standard_uncertainty_mpa').notNull(),
    /** Every output of the method with its unit; outer-fibre stress and stress at the origin apart. */
    outputs: jsonb().notNull(),
    budget: jsonb().notNull(),
    cautions: jsonb().notNull(),
    supersedesId: uuid(),
    remark: text().notNull().default(''),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.caseId, t.line), index().on(t.supersedesId)],
);

export const estimateInputs = pgTable(
  'estimate_inputs',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    estimateId: uuid()
      .notNull()
      .references(() => estimates.id),
    name: text().notNull(),
    /** In the unit of the method's table: N, mm, MPa, MPa√m or 1. */
    value: doublePrecision().notNull(),
    standardUncertainty: doublePrecision().notNull(),
    unit: text().notNull(),
    distribution: text({ enum: ['normal', 'rectangular', 'triangular'] }).notNull(),
    enteredText: text(),
    enteredUnit: text(),
    /** The uncertainty as it was stated: "6 %, standard"; absent where it is the reading's or the constant's own. */
    enteredUncertainty: text(),
    /** The edge of the mirror that a radius was read to or a mirror constant belongs to. */
    boundary: text({ enum: mirrorBoundaries }),
    sourceKind: text({ enum: ['typed', 'measurement', 'material constant'] }).notNull(),
    sourceId: uuid(),
    sourceNote: text().notNull().default(''),
  },
  (t) => [index().on(t.estimateId)],
);

/** A line set aside with a reason, or taken back: a record beside the estimate, which itself never changes. */
export const estimateStandings = pgTable(
  'estimate_standings',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    estimateId: uuid()
      .notNull()
      .references(() => estimates.id),
    standing: text({ enum: ['in use', 'set aside'] }).notNull(),
    reason: text().notNull(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.estimateId)],
);
