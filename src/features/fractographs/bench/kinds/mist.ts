import { carriesNothing, chainFrom, type MarkKindDrawing } from './kind.ts';

/** Fine roughening between mirror and hackle. */
export const mistDrawing: MarkKindDrawing = {
  finishesAt: null,
  geometryFrom: chainFrom,
  carries: carriesNothing,
  labelWords: () => 'mist',
};
