import { requireFinite, requireThat } from '../require.ts';
import { solveLinear } from '../special-functions/solve-linear.ts';
import { distancePx, type PointPx } from './distance.ts';

export type FittedCircle = {
  readonly centre: PointPx;
  /** px, > 0. */
  readonly radiusPx: number;
  /** Root mean square distance of the points from the circle, px. */
  readonly rmsPx: number;
};

// The refinement doubles its right digits each step; from the algebraic start a handful is enough.
const mostSteps = 50;
const smallStep = 1e-12;

/**
 * Circle closest to points, by distance. `points`: n ≥ 3, any order, not on one line.
 *
 * Starts from the algebraic fit (x² + y² + Dx + Ey + F = 0, least squares) and refines by Gauss-Newton on the distances.
 * A short arc fits a circle badly: look at the spread round the centre before trusting the radius.
 * @throws OutsideDomain, the first that applies: too-few-points, non-finite-input, points-in-line
 */
export function fitCircle(points: readonly PointPx[]): FittedCircle {
  requireThat(points.length >= 3, 'too-few-points', 'points');
  for (const point of points) requireFinite({ points: point.x + point.y });
  // about their mean and over their size, so that large coordinates cost no digits
  const middle = { x: mean(points.map((point) => point.x)), y: mean(points.map((point) => point.y)) };
  const size = Math.max(...points.map((point) => distancePx(middle, point)));
  requireThat(size > 0, 'points-in-line', 'points');
  const local = points.map((point) => ({ x: (point.x - middle.x) / size, y: (point.y - middle.y) / size }));
  const circle = refined(algebraic(local), local);
  const centre = { x: middle.x + circle.x * size, y: middle.y + circle.y * size };
  const radiusPx = circle.radius * size;
  const rmsPx = Math.sqrt(mean(points.map((point) => (distancePx(centre, point) - radiusPx) ** 2)));
  return { centre, radiusPx, rmsPx };
}

type Circle = { readonly x: number; readonly y: number; readonly radius: number };

function algebraic(points: readonly PointPx[]): Circle {
  const sum = (part: (point: PointPx) => number) => points.reduce((total, point) => total + part(point), 0);
  const square = (point: PointPx) => point.x ** 2 + point.y ** 2;
  const [xx, xy, yy] = [sum((p) => p.x * p.x), sum((p) => p.x * p.y), sum((p) => p.y * p.y)];
  // the smaller spread of the points over the larger; 1e-12 is rounding, so they lie on one line
  requireThat(xx * yy - xy * xy > 1e-12 * (xx + yy) ** 2, 'points-in-line', 'points');
  const solved = solveLinear(
    [
      [xx, xy],
      [xy, yy],
    ],
    [sum((p) => p.x * square(p)), sum((p) => p.y * square(p))],
  );
  requireThat(solved !== undefined, 'points-in-line', 'points');
  const [twiceX = 0, twiceY = 0] = solved ?? [];
  const [x, y] = [twiceX / 2, twiceY / 2];
  return { x, y, radius: Math.sqrt(x * x + y * y + mean(points.map(square))) };
}

function refined(start: Circle, points: readonly PointPx[]): Circle {
  let circle = start;
  for (let step = 0; step < mostSteps; step += 1) {
    const change = gaussNewtonStep(circle, points);
    if (!change) return circle;
    circle = { x: circle.x + change.x, y: circle.y + change.y, radius: circle.radius + change.radius };
    if (Math.hypot(change.x, change.y, change.radius) < smallStep * circle.radius) break;
  }
  return circle;
}

function gaussNewtonStep(circle: Circle, points: readonly PointPx[]): Circle | undefined {
  const normal = [
    [0, 0, 0],
    [0, 0, 0],
    [0, 0, 0],
  ];
  const right = [0, 0, 0];
  for (const point of points) {
    const distance = Math.hypot(point.x - circle.x, point.y - circle.y);
    if (distance === 0) return undefined;
    const slopes = [(point.x - circle.x) / distance, (point.y - circle.y) / distance, 1];
    slopes.forEach((slope, row) => {
      right[row] = (right[row] ?? 0) + slope * (distance - circle.radius);
      normal[row] = (normal[row] ?? []).map((entry, column) => entry + slope * (slopes[column] ?? 0));
    });
  }
  const [x, y, radius] = solveLinear(normal, right) ?? [];
  return x === undefined || y === undefined || radius === undefined ? undefined : { x, y, radius };
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}
