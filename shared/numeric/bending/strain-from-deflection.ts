import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

type Deflected = {
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
  /** Of the bar itself, without that of machine and fixture, mm, ≥ 0. */
  readonly deflectionMm: number;
};

// Deflection over span above which the formulas for small deflection are not used: trade practice.
export const mostDeflectionOverSpan = 0.1;

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
export function threePointStrain(bar: Deflected & { readonly outerSpanMm: number }): number {
  const { depthMm, deflectionMm, outerSpanMm } = bar;
  requireFinite({ depthMm, deflectionMm, outerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireSmallDeflection({ deflectionMm, spanMm: outerSpanMm });
  return (6 * depthMm * deflectionMm) / outerSpanMm ** 2;
}

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
export function fourPointStrain(bar: Deflected & FourPointSpans, at: DeflectionPlace): number {
  const { depthMm, deflectionMm, outerSpanMm, innerSpanMm } = bar;
  requireFinite({ depthMm, deflectionMm, outerSpanMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  requireSmallDeflection({ deflectionMm, spanMm: outerSpanMm });
  const armMm = momentArmMm(bar);
  if (at === 'mid-span') return (12 * depthMm * deflectionMm) / (3 * outerSpanMm ** 2 - 4 * armMm ** 2);
  return (3 * depthMm * deflectionMm) / (armMm * (3 * outerSpanMm - 4 * armMm));
}

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
export function relativeStrain(bar: Deflected & { readonly innerSpanMm: number }): number {
  const { depthMm, deflectionMm, innerSpanMm } = bar;
  requireFinite({ depthMm, deflectionMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ innerSpanMm }, 'non-positive-span');
  requireSmallDeflection({ deflectionMm, spanMm: innerSpanMm });
  return (4 * depthMm * deflectionMm) / innerSpanMm ** 2;
}

function requireSmallDeflection({ deflectionMm, spanMm }: { deflectionMm: number; spanMm: number }): void {
  requireNotNegative({ deflectionMm }, 'outside-validity-range');
  requireThat(deflectionMm <= mostDeflectionOverSpan * spanMm, 'outside-validity-range', 'deflectionMm');
}
