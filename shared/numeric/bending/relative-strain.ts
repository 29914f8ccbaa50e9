import { requireFinite, requirePositive } from '../require.ts';
import { requireSmallDeflection, type DeflectedBar } from './require-small-deflection.ts';

/**
 * Strain of the outer fibre between the inner rollers from the deflection of mid-span against these rollers, dimensionless,
 * ≥ 0. Method `strain.deflection4.relative`.
 *
 * The bar is bent to a circle there, so that shear and the outer arms do not count.
 * Source: beam theory, 4dδ/Li².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * outside-validity-range for the deflection
 * @example relativeStrain({ depthMm: 3, deflectionMm: 0.02, innerSpanMm: 20 }) // 0.0006
 */
export function relativeStrain(bar: DeflectedBar & { readonly innerSpanMm: number }): number {
  const { depthMm, deflectionMm, innerSpanMm } = bar;
  requireFinite({ depthMm, deflectionMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ innerSpanMm }, 'non-positive-span');
  requireSmallDeflection({ deflectionMm, spanMm: innerSpanMm });
  return (4 * depthMm * deflectionMm) / innerSpanMm ** 2;
}
