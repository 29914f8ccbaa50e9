import { carriesNothing, chainFrom, type MarkKindDrawing } from './kind.ts';

/** A ripple where the front met a sound wave. */
export const wallnerLineDrawing: MarkKindDrawing = {
  finishesAt: null,
  geometryFrom: chainFrom,
  carries: carriesNothing,
  labelWords: () => 'Wallner',
};
