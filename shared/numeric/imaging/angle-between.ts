import { requireFinite, requireThat } from '../require.ts';
import type { PointPx } from './distance.ts';

const degreesPerRadian = 180 / Math.PI;

/**
 * Angle at a corner between the lines to two points, degrees, 0 to 180.
 * @throws OutsideDomain, the first that applies: non-finite-input, too-few-points (a point lies on the corner)
 * @example angleBetweenDeg({ x: 0, y: 0 }, { x: 1, y: 0 }, { x: 0, y: 1 }) // 90
 */
export function angleBetweenDeg(corner: PointPx, one: PointPx, other: PointPx): number {
  const a = { x: one.x - corner.x, y: one.y - corner.y };
  const b = { x: other.x - corner.x, y: other.y - corner.y };
  requireFinite({ points: Math.hypot(a.x, a.y, b.x, b.y) });
  requireThat(Math.hypot(a.x, a.y) > 0 && Math.hypot(b.x, b.y) > 0, 'too-few-points', 'points');
  // atan2 of cross and dot keeps its digits near 0 and 180, where arccos loses half of them
  return Math.abs(Math.atan2(a.x * b.y - a.y * b.x, a.x * b.x + a.y * b.y)) * degreesPerRadian;
}
