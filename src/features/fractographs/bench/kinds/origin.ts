import type { MarkKindDrawing } from './kind.ts';

/** Where the crack began: one point, named by its code. */
export const originDrawing: MarkKindDrawing = {
  finishesAt: 1,
  geometryFrom: ({ points: [at] }) => (at ? { shape: 'point', at } : null),
  carries: ({ originCode }) => ({ boundary: null, originCode }),
  labelWords: () => '',
};
