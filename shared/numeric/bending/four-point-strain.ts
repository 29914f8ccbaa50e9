import { requireFinite, requirePositive } from '../require.ts';
import { requireSmallDeflection, type DeflectedBar } from './require-small-deflection.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

/** Where the deflection of a four-point bar was read. */
export type DeflectionPlace = 'mid-span' | 'inner rollers';

/**
 * Strain of the outer fibre between the inner rollers of a four-point bar from a deflection, dimensionless, ≥ 0.
 * Methods `strain.deflection4.midspan` and `strain.deflection4.loadpoint`.
 *
 * Holds for small deflection of a slender elastic bar with equal arms; shear is left out.
 * Source: beam theory with a = (Lo − Li)/2: 12dδ/(3Lo² − 4a²) at mid-span, 3dδ/[a(3Lo − 4a)] at the inner rollers.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, outside-validity-range for the deflection
 * @example fourPointStrain({ depthMm: 3, deflectionMm: 0.1, outerSpanMm: 40, innerSpanMm: 20 }, 'inner rollers') // 0.001125
 */
export function fourPointStrain(bar: DeflectedBar & FourPointSpans, at: DeflectionPlace): number {
  const { depthMm, deflectionMm, outerSpanMm, innerSpanMm } = bar;
  requireFinite({ depthMm, deflectionMm, outerSpanMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  requireSmallDeflection({ deflectionMm, spanMm: outerSpanMm });
  const armMm = momentArmMm(bar);
  if (at === 'mid-span') return (12 * depthMm * deflectionMm) / (3 * outerSpanMm ** 2 - 4 * armMm ** 2);
  return (3 * depthMm * deflectionMm) / (armMm * (3 * outerSpanMm - 4 * armMm));
}
