import { describe, expect, it } from 'vitest';
import type { MarkGeometry } from '#shared/contracts/marks.ts';
import { fieldsOf, readTyped, withFields } from './geometry-fields.ts';

const geometries: MarkGeometry[] = [
  { shape: 'point', at: { x: 1.5, y: 2 } },
  { shape: 'segment', from: { x: 1, y: 2 }, to: { x: 3, y: 4 }, measures: 'depth of origin' },
  {
    shape: 'chain',
    points: [
      { x: 1, y: 2 },
      { x: 3, y: 4 },
      { x: 5, y: 6 },
    ],
    centre: { x: 9, y: 9 },
  },
  {
    shape: 'ellipse',
    centre: { x: 1, y: 2 },
    halfAxisDepthPx: 3,
    halfAxisAlongPx: 4,
    turnDeg: 5,
    flawShape: 'ellipse',
    place: 'interior',
    points: [],
  },
];

describe('the numbers of a mark in the list', () => {
  it.each(geometries)('give the same mark back when none is changed: $shape', (geometry) => {
    expect(
      withFields(
        geometry,
        fieldsOf(geometry).map(({ value }) => value),
      ),
    ).toEqual(geometry);
  });

  it('are read with a comma or a point, and refused where they are none', () => {
    expect(readTyped(' 12,5 ')).toBe(12.5);
    expect(readTyped('−3')).toBe(-3);
    expect(readTyped('')).toBeNull();
    expect(readTyped('12 px')).toBeNull();
  });
});
