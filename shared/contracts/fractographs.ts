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
