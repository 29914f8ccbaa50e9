import { carriesNothing, type MarkKindDrawing } from './kind.ts';

/** A distance between two points, with its value beside it. */
export const lengthDrawing: MarkKindDrawing = {
  finishesAt: 2,
  geometryFrom: ({ points: [from, to], as }) =>
    from && to ? { shape: 'segment', from, to, ...(as.measures === 'length' ? {} : { measures: as.measures }) } : null,
  carries: carriesNothing,
  labelWords: (_mark, reading) => reading ?? '',
  again: ({ measures }) => ({ measures: measures === 'length' ? 'depth of origin' : 'length' }),
  chosenWords: ({ measures }) => (measures === 'length' ? 'any length' : 'depth of the origin below the surface'),
};
