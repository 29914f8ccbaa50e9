import { directionOf, meanPoint, minus, plus, type ShapeActs } from './shape.ts';

export const segmentActs: ShapeActs<'segment'> = {
  handles: ({ from, to }) => [from, to],
  withHandle: (geometry, index, to) => (index === 0 ? { ...geometry, from: to } : { ...geometry, to }),
  moved: (geometry, by) => ({ ...geometry, from: plus(geometry.from, by), to: plus(geometry.to, by) }),
  outline: ({ from, to }) => [from, to],
  labelPlace: ({ from, to }) => {
    const along = directionOf(minus(to, from));
    // the side that lies to the right, so that the label never stands in the line
    const side = { x: -along.y, y: along.x };
    return { at: meanPoint([from, to]), outward: side.x >= 0 ? side : { x: -side.x, y: -side.y } };
  },
};
