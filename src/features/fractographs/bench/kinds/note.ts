import { carriesNothing, type MarkKindDrawing } from './kind.ts';

const longestOnImage = 24;

/** A remark at a place. */
export const noteDrawing: MarkKindDrawing = {
  finishesAt: 1,
  geometryFrom: ({ points: [at] }) => (at ? { shape: 'point', at } : null),
  carries: carriesNothing,
  labelWords: ({ note }) => (note.length > longestOnImage ? `${note.slice(0, longestOnImage - 1)}…` : note),
};
