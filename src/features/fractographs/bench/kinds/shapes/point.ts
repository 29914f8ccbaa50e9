import { plus, type ShapeActs } from './shape.ts';

export const pointActs: ShapeActs<'point'> = {
  handles: ({ at }) => [at],
  withHandle: (geometry, _index, to) => ({ ...geometry, at: to }),
  moved: (geometry, by) => ({ ...geometry, at: plus(geometry.at, by) }),
  outline: ({ at }) => [at],
  labelPlace: ({ at }) => ({ at, outward: { x: -0.8, y: -0.6 } }),
};
