import { describe, expect, it } from 'vitest';
import { angleBetweenDeg } from './angle-between.ts';
import { halfAxesFromHandles } from './ellipse-from-handles.ts';
import { halfAxesFromPoints } from './ellipse-from-points.ts';
import { fitCircle } from './fit-circle.ts';
import { polylineLengthPx } from './polyline-length.ts';
import { radiusFromCentre } from './radius-from-centre.ts';

const degrees = Math.PI / 180;
const circlePoint = (angleDeg: number, radius = 50, centre = { x: 4000, y: 3000 }) => ({
  x: centre.x + radius * Math.cos(angleDeg * degrees),
  y: centre.y + radius * Math.sin(angleDeg * degrees),
});

describe('a circle through points', () => {
  it('passes through three of them: (0, 0), (6, 0), (0, 8) lie round (3, 4) at 5', () => {
    const circle = fitCircle([
      { x: 0, y: 0 },
      { x: 6, y: 0 },
      { x: 0, y: 8 },
    ]);
    expect(circle.centre.x).toBeCloseTo(3, 9);
    expect(circle.centre.y).toBeCloseTo(4, 9);
    expect(circle.radiusPx).toBeCloseTo(5, 9);
    expect(circle.rmsPx).toBeCloseTo(0, 9);
  });

  it('is found from a short arc far from the corner of the image', () => {
    const circle = fitCircle([0, 10, 20, 30, 40].map((angle) => circlePoint(angle)));
    expect(circle.centre.x).toBeCloseTo(4000, 6);
    expect(circle.radiusPx).toBeCloseTo(50, 6);
  });

  it('lies between points scattered evenly in and out', () => {
    const scattered = [0, 45, 90, 135, 180, 225, 270, 315].map((angle, index) =>
      circlePoint(angle, index % 2 === 0 ? 51 : 49),
    );
    const circle = fitCircle(scattered);
    expect(circle.radiusPx).toBeCloseTo(50, 9);
    expect(circle.rmsPx).toBeCloseTo(1, 9);
  });

  it('is no closer anywhere near than where it was put', () => {
    const points = [
      [0, 50.8],
      [40, 49],
      [75, 50.3],
      [110, 50.9],
      [160, 49.3],
    ].map(([angle, radius]) => circlePoint(angle ?? 0, radius));
    const { centre, radiusPx, rmsPx } = fitCircle(points);
    const squares = (dx: number, dy: number, dr: number) =>
      points.reduce((sum, p) => sum + (Math.hypot(p.x - centre.x - dx, p.y - centre.y - dy) - radiusPx - dr) ** 2, 0);
    const best = squares(0, 0, 0);
    expect(best).toBeCloseTo(rmsPx ** 2 * points.length, 9);
    const moved = [
      squares(0.01, 0, 0),
      squares(-0.01, 0, 0),
      squares(0, 0.01, 0),
      squares(0, -0.01, 0),
      squares(0, 0, 0.01),
    ];
    for (const other of moved) expect(other).toBeGreaterThan(best);
  });

  it('is refused for two points, points on a line, the same point three times, and no number', () => {
    const [a, b] = [circlePoint(0), circlePoint(90)];
    expect(() => fitCircle([a, b])).toThrow(expect.objectContaining({ code: 'too-few-points' }));
    const line = [0, 1, 2, 3].map((step) => ({ x: 100 + step, y: 200 + 2 * step }));
    expect(() => fitCircle(line)).toThrow(expect.objectContaining({ code: 'points-in-line' }));
    expect(() => fitCircle([a, a, a])).toThrow(expect.objectContaining({ code: 'points-in-line' }));
    expect(() => fitCircle([a, b, { x: Number.NaN, y: 0 }])).toThrow(
      expect.objectContaining({ code: 'non-finite-input' }),
    );
  });
});

describe('a radius from the origin', () => {
  it('is the mean with its scatter: 3, 4 and 5 give 4 with s = 1', () => {
    const reading = radiusFromCentre({ x: 0, y: 0 }, [
      { x: 3, y: 0 },
      { x: 0, y: -4 },
      { x: -3, y: 4 },
    ]);
    expect(reading.meanPx).toBeCloseTo(4, 12);
    expect(reading.scatterPx).toBeCloseTo(1, 12);
    expect(reading.standardUncertaintyPx).toBeCloseTo(1 / Math.sqrt(3), 12);
  });

  it('has no scatter from one point, and is refused for none', () => {
    expect(radiusFromCentre({ x: 0, y: 0 }, [{ x: 3, y: 4 }])).toEqual({
      meanPx: 5,
      scatterPx: null,
      standardUncertaintyPx: null,
      count: 1,
    });
    expect(() => radiusFromCentre({ x: 0, y: 0 }, [])).toThrow(expect.objectContaining({ code: 'too-few-points' }));
  });
});

describe('an ellipse about a centre', () => {
  const turned = (angleDeg: number, major: number, minor: number) =>
    [0, 50, 100, 170, 260].map((parameter) => {
      const [u, v] = [major * Math.cos(parameter * degrees), minor * Math.sin(parameter * degrees)];
      const [cos, sin] = [Math.cos(angleDeg * degrees), Math.sin(angleDeg * degrees)];
      return { x: 700 + u * cos - v * sin, y: 500 + u * sin + v * cos };
    });

  it.each([0, 30, 90, 135, 179])('is found when it lies at %i°', (angleDeg) => {
    const axes = halfAxesFromPoints({ x: 700, y: 500 }, turned(angleDeg, 80, 30));
    expect(axes.majorPx).toBeCloseTo(80, 8);
    expect(axes.minorPx).toBeCloseTo(30, 8);
    // 0° and 180° are one direction
    expect(Math.abs(Math.sin((axes.majorAngleDeg - angleDeg) * degrees))).toBeLessThan(1e-8);
  });

  it('is refused for points that open outwards, lie on one line through it, or are too few', () => {
    const centre = { x: 0, y: 0 };
    const hyperbola = [1, 2, 3].map((x) => ({ x, y: Math.sqrt(1 + x * x) }));
    expect(() => halfAxesFromPoints(centre, hyperbola)).toThrow(
      expect.objectContaining({ code: 'points-not-on-an-ellipse' }),
    );
    const line = [1, 2, 3].map((x) => ({ x, y: x }));
    expect(() => halfAxesFromPoints(centre, line)).toThrow(
      expect.objectContaining({ code: 'points-not-on-an-ellipse' }),
    );
    expect(() => halfAxesFromPoints(centre, [{ x: 1, y: 1 }])).toThrow(
      expect.objectContaining({ code: 'too-few-points' }),
    );
  });

  it('fills the box of its handles', () => {
    const corner = { x: 10, y: 10 };
    expect(halfAxesFromHandles({ corner, across: { x: 50, y: 10 }, down: { x: 10, y: 110 } })).toEqual({
      majorPx: 50,
      minorPx: 20,
      majorAngleDeg: 90,
    });
    expect(() => halfAxesFromHandles({ corner, across: corner, down: { x: 10, y: 110 } })).toThrow(
      expect.objectContaining({ code: 'non-positive-dimension' }),
    );
  });
});

describe('lines on an image', () => {
  it('have the length of all their pieces: 3-4-5 and then 10', () => {
    const chain = [
      { x: 0, y: 0 },
      { x: 3, y: 4 },
      { x: 13, y: 4 },
    ];
    expect(polylineLengthPx(chain)).toBe(15);
    expect(polylineLengthPx([...chain].reverse())).toBe(15);
    expect(() => polylineLengthPx([{ x: 0, y: 0 }])).toThrow(expect.objectContaining({ code: 'too-few-points' }));
  });

  it('meet at an angle from 0 to 180 degrees', () => {
    const corner = { x: 5, y: 5 };
    const right = { x: 6, y: 5 };
    expect(angleBetweenDeg(corner, right, { x: 5, y: 9 })).toBeCloseTo(90, 12);
    expect(angleBetweenDeg(corner, right, { x: -5, y: 5 })).toBeCloseTo(180, 12);
    expect(angleBetweenDeg(corner, right, { x: 9, y: 5 })).toBe(0);
    expect(() => angleBetweenDeg(corner, corner, right)).toThrow(expect.objectContaining({ code: 'too-few-points' }));
    expect(() => angleBetweenDeg(corner, right, { x: Number.NaN, y: 0 })).toThrow(
      expect.objectContaining({ code: 'non-finite-input' }),
    );
  });
});
