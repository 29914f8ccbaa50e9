import type { MarkGeometry } from '#shared/contracts/marks.ts';

/** One number of a geometry that can be typed: its word and its place, image px or degrees. */
export type GeometryField = { readonly word: string; readonly unit: 'px' | '°'; readonly value: number };

/** The numbers of a mark, in a fixed order. */
export function fieldsOf(geometry: MarkGeometry): readonly GeometryField[] {
  const px = (word: string, value: number): GeometryField => ({ word, unit: 'px', value });
  switch (geometry.shape) {
    case 'point':
      return [px('x', geometry.at.x), px('y', geometry.at.y)];
    case 'segment':
      return [
        px('from x', geometry.from.x),
        px('from y', geometry.from.y),
        px('to x', geometry.to.x),
        px('to y', geometry.to.y),
      ];
    case 'chain':
      return geometry.points.flatMap(({ x, y }, index) => [px(`${index + 1} x`, x), px(`${index + 1} y`, y)]);
    case 'ellipse':
      return [
        px('centre x', geometry.centre.x),
        px('centre y', geometry.centre.y),
        px('half-axis, depth', geometry.halfAxisDepthPx),
        px('half-axis, along', geometry.halfAxisAlongPx),
        { word: 'turn', unit: '°', value: geometry.turnDeg },
      ];
  }
}

/** The mark with its numbers typed anew, in the order of `fieldsOf`. Typed half-axes no longer are those of drawn points. */
export function withFields(geometry: MarkGeometry, values: readonly number[]): MarkGeometry {
  const [a = 0, b = 0, c = 0, d = 0, e = 0] = values;
  switch (geometry.shape) {
    case 'point':
      return { ...geometry, at: { x: a, y: b } };
    case 'segment':
      return { ...geometry, from: { x: a, y: b }, to: { x: c, y: d } };
    case 'chain':
      return {
        ...geometry,
        points: geometry.points.map((_, index) => ({ x: values[2 * index], y: values[2 * index + 1] })),
      };
    case 'ellipse':
      return { ...geometry, centre: { x: a, y: b }, halfAxisDepthPx: c, halfAxisAlongPx: d, turnDeg: e, points: [] };
  }
}

/** A typed number; null where it is none. A comma counts as the decimal sign. */
export function readTyped(text: string): number | null {
  const cleaned = text.trim().replace('−', '-').replace(',', '.');
  const value = cleaned === '' ? NaN : Number(cleaned);
  return Number.isFinite(value) ? value : null;
}
