import { requireThat } from '../require.ts';
import { distancePx, type PointPx } from './distance.ts';

/**
 * Length along a chain of points in their order, px, ≥ 0. `points`: n ≥ 2; not closed.
 * @throws OutsideDomain, the first that applies: too-few-points, non-finite-input
 */
export function polylineLengthPx(points: readonly PointPx[]): number {
  requireThat(points.length >= 2, 'too-few-points', 'points');
  return points.slice(1).reduce((sum, point, index) => sum + distancePx(points[index] ?? point, point), 0);
}
