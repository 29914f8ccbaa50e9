import { requireFinite, requirePositive } from '../require.ts';
import { distancePx, type PointPx } from './distance.ts';
import type { HalfAxes } from './ellipse.ts';

const degreesPerRadian = 180 / Math.PI;

/** A box round an ellipse by three of its corners: one corner, and the two next to it. */
export type EllipseHandles = { readonly corner: PointPx; readonly across: PointPx; readonly down: PointPx };

/**
 * Half-axes of the ellipse that fills a box, upright or turned, from the handles at its corners. The sides are taken as
 * square to one another.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension (a side of no length)
 */
export function halfAxesFromHandles(handles: EllipseHandles): HalfAxes {
  const { corner, across, down } = handles;
  const acrossPx = distancePx(corner, across) / 2;
  const downPx = distancePx(corner, down) / 2;
  requireFinite({ acrossPx, downPx });
  requirePositive({ acrossPx, downPx }, 'non-positive-dimension');
  const end = acrossPx >= downPx ? across : down;
  const angle = Math.atan2(end.y - corner.y, end.x - corner.x) * degreesPerRadian;
  return {
    majorPx: Math.max(acrossPx, downPx),
    minorPx: Math.min(acrossPx, downPx),
    majorAngleDeg: ((angle % 180) + 180) % 180,
  };
}
