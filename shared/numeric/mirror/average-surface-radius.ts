import { requireFinite, requirePositive } from '../require.ts';

/**
 * Mirror radius of an origin at the surface, mm, > 0: the mean of the two radii read along the tensile surface, left and
 * right of the origin. Method `mirror.averageRadius.surface`.
 *
 * Source: common practice; the radius lies along the original surface (ASTM C1256-93).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-mirror-radius
 * @example averageSurfaceRadiusMm({ leftRadiusMm: 0.412, rightRadiusMm: 0.436 }) // 0.424
 */
export function averageSurfaceRadiusMm(mirror: {
  readonly leftRadiusMm: number;
  readonly rightRadiusMm: number;
}): number {
  const { leftRadiusMm, rightRadiusMm } = mirror;
  requireFinite({ leftRadiusMm, rightRadiusMm });
  requirePositive({ leftRadiusMm, rightRadiusMm }, 'non-positive-mirror-radius');
  return (leftRadiusMm + rightRadiusMm) / 2;
}
