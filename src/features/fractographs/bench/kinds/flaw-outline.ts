import { carriesNothing, type MarkKindDrawing } from './kind.ts';
import { ellipseThrough } from './shapes/ellipse.ts';

/** The edge of the flaw, read as an ellipse or half of one. */
export const flawOutlineDrawing: MarkKindDrawing = {
  finishesAt: null,
  geometryFrom: ({ points, closed }) => ellipseThrough(points, closed),
  carries: carriesNothing,
  labelWords: () => 'flaw',
};
