import { carriesNothing, type MarkKindDrawing } from './kind.ts';

/** A line along the crack's run, from near the origin outward. */
export const hackleDrawing: MarkKindDrawing = {
  finishesAt: 2,
  geometryFrom: ({ points: [from, to] }) => (from && to ? { shape: 'segment', from, to } : null),
  carries: carriesNothing,
  labelWords: () => '',
};
