import type { MarkGeometry, PointPx } from '#shared/contracts/marks.ts';

export type GeometryOf<Shape extends MarkGeometry['shape']> = Extract<MarkGeometry, { shape: Shape }>;

/** Where a label stands: at a point of the mark, and away from it in that direction (of length 1). */
export type LabelPlace = { readonly at: PointPx; readonly outward: PointPx };

/** What can be done with a geometry of one shape, all of it in image px. */
export type ShapeActs<Shape extends MarkGeometry['shape']> = {
  /** The points that can be taken hold of. */
  handles(geometry: GeometryOf<Shape>): readonly PointPx[];
  /** With one handle moved. */
  withHandle(geometry: GeometryOf<Shape>, index: number, to: PointPx): GeometryOf<Shape>;
  /** Moved as a whole. */
  moved(geometry: GeometryOf<Shape>, by: PointPx): GeometryOf<Shape>;
  /** The line that is drawn, as points near enough to look smooth. */
  outline(geometry: GeometryOf<Shape>): readonly PointPx[];
  labelPlace(geometry: GeometryOf<Shape>): LabelPlace;
};

export const plus = (point: PointPx, by: PointPx): PointPx => ({ x: point.x + by.x, y: point.y + by.y });
export const minus = (point: PointPx, from: PointPx): PointPx => ({ x: point.x - from.x, y: point.y - from.y });
export const times = (point: PointPx, factor: number): PointPx => ({ x: point.x * factor, y: point.y * factor });
export const lengthOf = (point: PointPx): number => Math.hypot(point.x, point.y);

/** The direction of a vector, of length 1; straight up for none. */
export function directionOf(vector: PointPx): PointPx {
  const length = lengthOf(vector);
  return length === 0 ? { x: 0, y: -1 } : times(vector, 1 / length);
}

export function meanPoint(points: readonly PointPx[]): PointPx {
  const sum = points.reduce(plus, { x: 0, y: 0 });
  return times(sum, 1 / points.length);
}
