import { requireFinite, requirePositive } from '../require.ts';

export type EllipseRadius = {
  /** Right for a clear ellipse, mm. */
  readonly geometricMeanMm: number;
  /** Right for a near-circle, mm, ≥ the geometric mean. */
  readonly arithmeticMeanMm: number;
};

/**
 * Mirror radius of an origin inside the section from radii in two directions at right angles, mm, > 0.
 * Method `mirror.averageRadius.ellipse`.
 *
 * Holds in nearly uniform stress; in a bent bar the radii along the tensile face are to be preferred.
 * Source: common practice.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-mirror-radius
 * @example averageEllipseRadius({ radius1Mm: 0.3, radius2Mm: 0.36 }) // { geometricMeanMm: 0.3286…, arithmeticMeanMm: 0.33 }
 */
export function averageEllipseRadius(mirror: {
  readonly radius1Mm: number;
  readonly radius2Mm: number;
}): EllipseRadius {
  const { radius1Mm, radius2Mm } = mirror;
  requireFinite({ radius1Mm, radius2Mm });
  requirePositive({ radius1Mm, radius2Mm }, 'non-positive-mirror-radius');
  return { geometricMeanMm: Math.sqrt(radius1Mm * radius2Mm), arithmeticMeanMm: (radius1Mm + radius2Mm) / 2 };
}
