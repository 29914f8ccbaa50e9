import { requireFinite, requireThat } from '../require.ts';
import { solveLinear } from '../special-functions/solve-linear.ts';
import { distancePx, type PointPx } from './distance.ts';
import type { HalfAxes } from './ellipse.ts';

const degreesPerRadian = 180 / Math.PI;

/**
 * Half-axes of the ellipse about a known centre through points on its edge. `points`: n ≥ 3, any order.
 *
 * Least squares of A u² + B u v + C v² = 1, where u and v run from the centre; exact for three points.
 * @throws OutsideDomain, the first that applies: too-few-points, non-finite-input, points-not-on-an-ellipse
 */
export function halfAxesFromPoints(centre: PointPx, points: readonly PointPx[]): HalfAxes {
  requireThat(points.length >= 3, 'too-few-points', 'points');
  const size = Math.max(...points.map((point) => distancePx(centre, point)));
  requireFinite({ points: size });
  requireThat(size > 0, 'points-not-on-an-ellipse', 'points');
  const conic = fittedConic(
    points.map((point) => ({ x: (point.x - centre.x) / size, y: (point.y - centre.y) / size })),
  );
  requireThat(conic !== undefined, 'points-not-on-an-ellipse', 'points');
  const [a = 0, b = 0, c = 0] = conic ?? [];
  const spread = Math.hypot(a - c, b);
  const [smallest, largest] = [(a + c - spread) / 2, (a + c + spread) / 2];
  requireThat(smallest > 0, 'points-not-on-an-ellipse', 'points');
  // the larger half-axis lies where the conic grows most slowly
  const turned = (Math.atan2(-b, c - a) / 2) * degreesPerRadian;
  const majorAngleDeg = spread === 0 ? 0 : (turned + 180) % 180;
  return { majorPx: size / Math.sqrt(smallest), minorPx: size / Math.sqrt(largest), majorAngleDeg };
}

function fittedConic(points: readonly PointPx[]): number[] | undefined {
  const terms = points.map(({ x, y }) => [x * x, x * y, y * y]);
  const at = (row: readonly number[], index: number) => row[index] ?? 0;
  const normal = [0, 1, 2].map((row) =>
    [0, 1, 2].map((column) => terms.reduce((sum, term) => sum + at(term, row) * at(term, column), 0)),
  );
  const right = [0, 1, 2].map((row) => terms.reduce((sum, term) => sum + at(term, row), 0));
  return solveLinear(normal, right);
}
