import { bigint, date, doublePrecision, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import {
  calibrationWays,
  fractographStandings,
  fractographStates,
  fractographViews,
} from '../../../shared/vocabulary/fractographs.ts';
import { faces } from '../../../shared/vocabulary/pieces.ts';
import { id, instant } from '../columns.ts';
import { cases } from './cases.ts';
import { fragments } from './evidence.ts';
import { people } from './people.ts';

export const instruments = pgTable('instruments', {
  id: id(),
  name: text().notNull().unique(),
  kind: text({
    enum: ['stereo', 'compound', 'electron', 'profilometer', 'camera', 'micrometer', 'load cell', 'polariscope'],
  }).notNull(),
  version: integer().notNull().default(1),
});

/** A record: a pixel size with its source and uncertainty. Replaced by a newer one, never changed. */
export const calibrations = pgTable(
  'calibrations',
  {
    id: id(),
    /** CAL-06 for one kept for an instrument; absent for one read off a single image. */
    code: text(),
    instrumentId: uuid().references(() => instruments.id),
    /** Set for one that belongs to a case's image, so that its wall holds. */
    caseId: uuid().references(() => cases.id),
    setting: text(),
    way: text({ enum: calibrationWays }).notNull(),
    pixelSizeXUm: doublePrecision().notNull(),
    pixelSizeYUm: doublePrecision().notNull(),
    /** Relative standard uncertainty of the pixel size (dimensionless). */
    relativeUncertainty: doublePrecision().notNull(),
    /** The readings behind it: bar length and unit as typed, px of each reading, tags of the file. */
    reading: jsonb().notNull(),
    source: text().notNull(),
    asFoundErrorPercent: doublePrecision(),
    validFrom: date({ mode: 'string' }).notNull(),
    supersedesId: uuid(),
    reason: text(),
    madeBy: uuid()
      .notNull()
      .references(() => people.id),
    madeAt: instant().notNull(),
  },
  (t) => [index().on(t.code), index().on(t.supersedesId), index().on(t.caseId)],
);

/** Bytes as they came in, named by their SHA-256. */
export const keptFiles = pgTable('kept_files', {
  sha256: text().primaryKey(),
  bytes: bigint({ mode: 'number' }).notNull(),
  keptAt: instant().notNull(),
});

export const fractographs = pgTable(
  'fractographs',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    /** Fig. n, through the case. */
    figureNumber: integer().notNull(),
    sha256: text()
      .notNull()
      .references(() => keptFiles.sha256),
    fileName: text().notNull(),
    bytes: bigint({ mode: 'number' }).notNull(),
    state: text({ enum: fractographStates }).notNull(),
    refusedReason: text(),
    /** Share of the tiles cut, 0 to 1. */
    progress: doublePrecision().notNull().default(0),
    format: text(),
    widthPx: integer(),
    heightPx: integer(),
    bitDepth: integer(),
    /** Pixel size found in the file's own tags, to be confirmed by a person. */
    tagPixelSizeUm: doublePrecision(),
    tagSource: text(),
    caption: text().notNull().default(''),
    fragmentId: uuid().references(() => fragments.id),
    face: text({ enum: faces }),
    view: text({ enum: fractographViews }),
    standing: text({ enum: fractographStandings }).notNull().default('record'),
    instrumentId: uuid().references(() => instruments.id),
    objective: text(),
    fieldWidthMm: doublePrecision(),
    tiltDeg: doublePrecision(),
    illumination: text(),
    detector: text(),
    coating: text(),
    takenBy: text(),
    takenOn: date({ mode: 'string' }),
    broughtInBy: uuid()
      .notNull()
      .references(() => people.id),
    broughtInAt: instant().notNull(),
    version: integer().notNull().default(1),
  },
  (t) => [unique('fractographs_figure').on(t.caseId, t.figureNumber), index().on(t.sha256)],
);

/** A record: this image's scale is that calibration, from now on. */
export const calibrationBindings = pgTable(
  'calibration_bindings',
  {
    id: id(),
    caseId: uuid()
      .notNull()
      .references(() => cases.id),
    fractographId: uuid()
      .notNull()
      .references(() => fractographs.id),
    calibrationId: uuid()
      .notNull()
      .references(() => calibrations.id),
    supersedesId: uuid(),
    reason: text(),
    boundBy: uuid()
      .notNull()
      .references(() => people.id),
    boundAt: instant().notNull(),
  },
  (t) => [index().on(t.fractographId), index().on(t.calibrationId)],
);
