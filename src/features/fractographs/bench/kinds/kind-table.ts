import type { MarkKind } from '#shared/vocabulary/mark-kinds.ts';
import { arrestLineDrawing } from './arrest-line.ts';
import { compressionCurlDrawing } from './compression-curl.ts';
import { flawOutlineDrawing } from './flaw-outline.ts';
import { hackleDrawing } from './hackle.ts';
import type { MarkKindDrawing } from './kind.ts';
import { lengthDrawing } from './length.ts';
import { mirrorDrawing } from './mirror.ts';
import { mistDrawing } from './mist.ts';
import { noteDrawing } from './note.ts';
import { originDrawing } from './origin.ts';
import { wallnerLineDrawing } from './wallner-line.ts';

/** Every kind of mark the bench draws. */
export const kindTable: Readonly<Record<MarkKind, MarkKindDrawing>> = {
  origin: originDrawing,
  'flaw outline': flawOutlineDrawing,
  mirror: mirrorDrawing,
  mist: mistDrawing,
  hackle: hackleDrawing,
  'wallner line': wallnerLineDrawing,
  'arrest line': arrestLineDrawing,
  'compression curl': compressionCurlDrawing,
  length: lengthDrawing,
  note: noteDrawing,
};
