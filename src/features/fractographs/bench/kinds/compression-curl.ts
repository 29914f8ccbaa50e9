import { carriesNothing, chainFrom, type MarkKindDrawing } from './kind.ts';

/** The lip where the crack turned on the compressed side. */
export const compressionCurlDrawing: MarkKindDrawing = {
  finishesAt: null,
  geometryFrom: chainFrom,
  carries: carriesNothing,
  labelWords: () => 'curl',
};
