import { requireThat } from '../require.ts';
import { distancePx, type PointPx } from './distance.ts';

export type RadiusReading = {
  /** Mean distance from the centre, px. */
  readonly meanPx: number;
  /** Standard deviation of the distances, px; `null` for one point. */
  readonly scatterPx: number | null;
  /** Standard uncertainty of the mean, s/√n, px; `null` for one point. */
  readonly standardUncertaintyPx: number | null;
  readonly count: number;
};

/**
 * Radius from a centre to points on a boundary, as a mirror is read from its origin. `points`: n ≥ 1, any order.
 * @throws OutsideDomain, the first that applies: too-few-points, non-finite-input
 */
export function radiusFromCentre(centre: PointPx, points: readonly PointPx[]): RadiusReading {
  requireThat(points.length >= 1, 'too-few-points', 'points');
  const count = points.length;
  const radii = points.map((point) => distancePx(centre, point));
  const meanPx = radii.reduce((sum, radius) => sum + radius, 0) / count;
  if (count === 1) return { meanPx, scatterPx: null, standardUncertaintyPx: null, count };
  const scatterPx = Math.sqrt(radii.reduce((sum, radius) => sum + (radius - meanPx) ** 2, 0) / (count - 1));
  return { meanPx, scatterPx, standardUncertaintyPx: scatterPx / Math.sqrt(count), count };
}
