import { requireFinite, requirePositive } from '../require.ts';
import { requireSmallDeflection, type DeflectedBar } from './require-small-deflection.ts';

/**
 * Strain of the outer fibre at mid-span of a three-point bar from the deflection there, dimensionless, ≥ 0.
 * Method `strain.deflection3`.
 *
 * Holds for small deflection of a slender elastic bar; shear is left out.
 * Source: beam theory, 6dδ/L².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * outside-validity-range for the deflection
 * @example threePointStrain({ depthMm: 3, deflectionMm: 0.12, outerSpanMm: 40 }) // 0.00135
 */
export function threePointStrain(bar: DeflectedBar & { readonly outerSpanMm: number }): number {
  const { depthMm, deflectionMm, outerSpanMm } = bar;
  requireFinite({ depthMm, deflectionMm, outerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireSmallDeflection({ deflectionMm, spanMm: outerSpanMm });
  return (6 * depthMm * deflectionMm) / outerSpanMm ** 2;
}
