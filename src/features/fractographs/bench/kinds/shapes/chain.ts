import type { PointPx } from '#shared/contracts/marks.ts';
import { directionOf, meanPoint, minus, plus, times, type ShapeActs } from './shape.ts';

const stepsPerSpan = 12;

export const chainActs: ShapeActs<'chain'> = {
  handles: ({ points }) => points,
  withHandle: (geometry, index, to) => ({
    ...geometry,
    points: geometry.points.map((point, each) => (each === index ? to : point)),
  }),
  moved: (geometry, by) => ({ ...geometry, points: geometry.points.map((point) => plus(point, by)) }),
  outline: ({ points }) => smoothLine(points),
  labelPlace: ({ points, centre }) => {
    const top = points.reduce((highest, point) => (point.y < highest.y ? point : highest), points[0]);
    return { at: top, outward: directionOf(minus(top, centre ?? plus(meanPoint(points), { x: 0, y: 1 }))) };
  },
};

/** A line through all points that bends smoothly (Catmull-Rom); two points stay a straight line. */
export function smoothLine(points: readonly PointPx[]): readonly PointPx[] {
  if (points.length < 3) return points;
  const line: PointPx[] = [points[0]];
  for (let span = 0; span < points.length - 1; span += 1) {
    const [one, two] = [points[span], points[span + 1]];
    // beyond its ends the line goes on bending as it did
    const before = points[span - 1] ?? goingOn(one, two, points[span + 2] ?? two);
    const after = points[span + 2] ?? goingOn(two, one, points[span - 1] ?? one);
    for (let step = 1; step <= stepsPerSpan; step += 1) {
      line.push(between({ before, one, two, after }, step / stepsPerSpan));
    }
  }
  return line;
}

/** The point before `first` on the parabola through three points one step apart. */
function goingOn(first: PointPx, second: PointPx, third: PointPx): PointPx {
  return plus(minus(times(first, 3), times(second, 3)), third);
}

type Span = { before: PointPx; one: PointPx; two: PointPx; after: PointPx };

function between({ before, one, two, after }: Span, t: number): PointPx {
  const at = (p0: number, p1: number, p2: number, p3: number) =>
    0.5 * (2 * p1 + (p2 - p0) * t + (2 * p0 - 5 * p1 + 4 * p2 - p3) * t ** 2 + (3 * p1 - p0 - 3 * p2 + p3) * t ** 3);
  return { x: at(before.x, one.x, two.x, after.x), y: at(before.y, one.y, two.y, after.y) };
}
