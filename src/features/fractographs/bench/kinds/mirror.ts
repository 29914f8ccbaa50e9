import { mirrorBoundaries } from '#shared/vocabulary/mirror-boundaries.ts';
import { chainFrom, type MarkKindDrawing } from './kind.ts';

/** One edge of the mirror; which one is always said. */
export const mirrorDrawing: MarkKindDrawing = {
  finishesAt: null,
  geometryFrom: chainFrom,
  carries: ({ boundary }) => ({ boundary, originCode: null }),
  labelWords: ({ boundary }) => (boundary && boundary !== 'not stated' ? `mirror, ${boundary}` : 'mirror'),
  again: ({ boundary }) => ({
    boundary: mirrorBoundaries[(mirrorBoundaries.indexOf(boundary) + 1) % mirrorBoundaries.length],
  }),
  chosenWords: ({ boundary }) => (boundary === 'not stated' ? 'boundary not stated' : `${boundary} boundary`),
};
