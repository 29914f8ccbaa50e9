import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';
import { mostDeflectionOverSpan } from './require-small-deflection.ts';

/**
 * True moment at mid-span of a three-point bar on free rollers over FL/4, dimensionless, ≥ 1. Method `error.largeDeflection3`.
 *
 * First order in (δ/L)²; the elastica gives 1.00670 for 1.00669 at δ/L = 0.0334 and 1.063 for 1.060 at 0.10, beyond which it
 * is refused.
 * Source: reaction at right angles to the beam, 1 + 2(δ/L) tan θ ≈ 1 + 6(δ/L)².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-span, outside-validity-range
 * @example largeDeflectionFactor({ deflectionMm: 2, outerSpanMm: 60 }) // 1.00667
 */
export function largeDeflectionFactor(bar: { readonly deflectionMm: number; readonly outerSpanMm: number }): number {
  const { deflectionMm, outerSpanMm } = bar;
  requireFinite({ deflectionMm, outerSpanMm });
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireNotNegative({ deflectionMm }, 'outside-validity-range');
  requireThat(deflectionMm <= mostDeflectionOverSpan * outerSpanMm, 'outside-validity-range', 'deflectionMm');
  return 1 + 6 * (deflectionMm / outerSpanMm) ** 2;
}
