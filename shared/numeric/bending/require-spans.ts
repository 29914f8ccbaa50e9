import { requireNotNegative, requirePositive, requireThat } from '../require.ts';

export type FourPointSpans = {
  /** Lower rollers apart, mm, > 0. */
  readonly outerSpanMm: number;
  /** Upper rollers apart, mm, ≥ 0, < outer span. */
  readonly innerSpanMm: number;
};

/** Refuses spans of four-point bending that are none: non-positive-span, negative-inner-span, inner-span-not-less-than-outer. */
export function requireFourPointSpans({ outerSpanMm, innerSpanMm }: FourPointSpans): void {
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireNotNegative({ innerSpanMm }, 'negative-inner-span');
  requireThat(innerSpanMm < outerSpanMm, 'inner-span-not-less-than-outer', 'innerSpanMm');
}

/** Outer to inner roller along the bar, (Lo − Li)/2, mm. */
export function momentArmMm({ outerSpanMm, innerSpanMm }: FourPointSpans): number {
  return (outerSpanMm - innerSpanMm) / 2;
}
