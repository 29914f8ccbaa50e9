import { carriesNothing, chainFrom, type MarkKindDrawing } from './kind.ts';

/** Where the front stood still. */
export const arrestLineDrawing: MarkKindDrawing = {
  finishesAt: null,
  geometryFrom: chainFrom,
  carries: carriesNothing,
  labelWords: () => 'arrest',
};
