import { requireFinite } from '../require.ts';

/** A place on an image, image px, x to the right and y down. */
export type PointPx = { readonly x: number; readonly y: number };

/**
 * Straight distance between two points, px, ≥ 0.
 * @throws OutsideDomain non-finite-input
 */
export function distancePx(from: PointPx, to: PointPx): number {
  const distance = Math.hypot(to.x - from.x, to.y - from.y);
  requireFinite({ points: distance });
  return distance;
}
