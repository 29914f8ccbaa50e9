import { z } from 'zod';
import {
  calibrationWays,
  fractographStandings,
  fractographStates,
  fractographViews,
} from '../vocabulary/fractographs.ts';
import { faces } from '../vocabulary/pieces.ts';
import { CaseNumber, FractographId } from './ids.ts';

export const Named = z.object({ id: z.uuid(), name: z.string() });
export type Named = z.infer<typeof Named>;

/** Why a record no longer rests on what is in force. */
export const StaleView = z.object({
  why: z.string(),
  since: z.iso.datetime(),
  causeKind: z.string(),
  causeId: z.uuid(),
  replacedById: z.uuid().nullable(),
});
export type StaleView = z.infer<typeof StaleView>;

/** The scale an image is bound to; without one no length is shown. */
export const ScaleView = z.object({
  bindingId: z.uuid(),
  calibrationId: z.uuid(),
  code: z.string().nullable(),
  way: z.enum(calibrationWays),
  pixelSizeXUm: z.number().positive(),
  pixelSizeYUm: z.number().positive(),
  relativeUncertainty: z.number().nonnegative(),
  source: z.string(),
  boundBy: Named,
  boundAt: z.iso.datetime(),
  stale: StaleView.nullable(),
});
export type ScaleView = z.infer<typeof ScaleView>;

export const FractographView = z.object({
  id: FractographId,
  figureNumber: z.number().int().positive(),
  fileName: z.string(),
  bytes: z.number().int(),
  sha256: z.string(),
  state: z.enum(fractographStates),
  refusedReason: z.string().nullable(),
  progress: z.number().min(0).max(1),
  format: z.string().nullable(),
  widthPx: z.number().int().nullable(),
  heightPx: z.number().int().nullable(),
  bitDepth: z.number().int().nullable(),
  tagPixelSizeUm: z.number().nullable(),
  tagSource: z.string().nullable(),
  caption: z.string(),
  fragment: z.object({ id: z.uuid(), code: z.string() }).nullable(),
  face: z.enum(faces).nullable(),
  view: z.enum(fractographViews).nullable(),
  standing: z.enum(fractographStandings),
  instrument: Named.nullable(),
  objective: z.string().nullable(),
  fieldWidthMm: z.number().nullable(),
  tiltDeg: z.number().nullable(),
  illumination: z.string().nullable(),
  detector: z.string().nullable(),
  coating: z.string().nullable(),
  takenBy: z.string().nullable(),
  takenOn: z.iso.date().nullable(),
  broughtInBy: Named,
  broughtInAt: z.iso.datetime(),
  /** Figures of this case with the same bytes. */
  sameBytesAs: z.array(z.object({ id: z.uuid(), figureNumber: z.number().int() })),
  /** The image of the mating face, where the pieces are paired and it has been brought in. */
  mateId: z.uuid().nullable(),
  scale: ScaleView.nullable(),
  markCount: z.number().int(),
  version: z.number().int(),
});
export type FractographView = z.infer<typeof FractographView>;
export const FractographList = z.array(FractographView);

export const FractographPath = z.object({ number: CaseNumber, fractographId: FractographId });

/** What may come along with a file, as text fields of the form. */
export const FractographFields = z.object({
  caption: z.string().trim().max(2000).default(''),
  fragmentId: z.uuid().optional(),
  face: z.enum(faces).optional(),
  view: z.enum(fractographViews).optional(),
});
export type FractographFields = z.infer<typeof FractographFields>;

const shortText = z.string().trim().max(200).nullable();

/** What a person says of a fractograph; fields left out stay as they are, null takes them away. */
export const FractographDescription = z
  .object({
    caption: z.string().trim().max(2000),
    fragmentId: z.uuid().nullable(),
    face: z.enum(faces).nullable(),
    view: z.enum(fractographViews).nullable(),
    standing: z.enum(fractographStandings),
    instrumentId: z.uuid().nullable(),
    objective: shortText,
    fieldWidthMm: z.number().positive('A field width is above 0 mm.').nullable(),
    tiltDeg: z.number().min(-90).max(90).nullable(),
    illumination: shortText,
    detector: shortText,
    coating: shortText,
    takenBy: shortText,
    takenOn: z.iso.date().nullable(),
  })
  .partial();
export type FractographDescription = z.infer<typeof FractographDescription>;
export const FractographDescribed = FractographDescription.extend({ versionSeen: z.number().int() });
export type FractographDescribed = z.infer<typeof FractographDescribed>;

const wholeNumber = z.coerce.number().int().nonnegative();

export const TilePath = FractographPath.extend({
  level: wholeNumber.max(30),
  /** `3_0`: column and row, as the tile's file is named. */
  place: z.string().regex(/^\d{1,5}_\d{1,5}$/, 'A tile is named column_row.'),
});

export const PreviewQuery = z.object({ width: z.coerce.number().int().min(1).max(4000).default(320) });

/** A small picture around a point (image px), `width` × `height` px large, showing `across` image px side to side. */
export const CropQuery = z.object({
  x: z.coerce.number(),
  y: z.coerce.number(),
  width: z.coerce.number().int().min(8).max(1600).default(160),
  height: z.coerce.number().int().min(8).max(1600).default(120),
  across: z.coerce.number().positive().optional(),
});
export type CropQuery = z.infer<typeof CropQuery>;

const pointPx = z.object({ x: z.number(), y: z.number() });
const pixelSizeUm = z.number().positive('A pixel size is above 0 µm.');

/** One reading along a burned-in bar: both ends, image px. */
export const BarReading = z.object({ from: pointPx, to: pointPx });
export type BarReading = z.infer<typeof BarReading>;

/** A way to a scale, as a person gives it. Uncertainties are relative standard uncertainties (k = 1), dimensionless. */
export const ScaleReading = z.discriminatedUnion('way', [
  z.object({
    way: z.literal('typed'),
    pixelSizeXUm: pixelSizeUm,
    /** Left out where the pixels are square. */
    pixelSizeYUm: pixelSizeUm.optional(),
    relativeUncertainty: z.number().positive('A pixel size has an uncertainty above 0.').max(0.5),
    /** Where the number is from: "stage scale SM-2, certificate of May". */
    source: z.string().trim().min(3, 'Say where the pixel size is from.').max(500),
    typed: z.string().trim().min(1).max(100),
  }),
  z.object({
    way: z.literal('burned bar'),
    readings: z.array(BarReading).min(2, 'Read the bar twice, so that its spread is known.').max(20),
    barLengthUm: z.number().positive('A scale bar has a length above 0 µm. Read it off the image, for example 500.'),
    barStandardUncertaintyUm: z.number().nonnegative(),
    typed: z.string().trim().min(1).max(100),
  }),
  z.object({
    way: z.literal('file tags'),
    /** The size the person looked at and confirmed, µm. */
    pixelSizeUm,
    relativeUncertainty: z.number().positive('A pixel size has an uncertainty above 0.').max(0.5),
  }),
  z.object({ way: z.literal('kept calibration'), calibrationId: z.uuid() }),
]);
export type ScaleReading = z.infer<typeof ScaleReading>;

/** Binds an image to a scale. `bindingSeen` is the binding in force on the page, null where there was none. */
export const ScaleBinding = z.object({
  reading: ScaleReading,
  bindingSeen: z.uuid().nullable(),
  /** True once a person was asked about ways that disagree and stands by this one. */
  confirmed: z.boolean().default(false),
  reason: z.string().trim().max(2000).default(''),
});
export type ScaleBinding = z.infer<typeof ScaleBinding>;

/** One binding of an image's history, newest first. */
export const ScaleHistory = z.array(ScaleView.extend({ inForce: z.boolean(), reason: z.string().nullable() }));
