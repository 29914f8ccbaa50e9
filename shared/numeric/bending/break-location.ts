import { requireFinite, requireThat } from '../require.ts';
import { fourPointMomentRatio } from './four-point-moment-ratio.ts';
import { requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

export type BreakLocation = {
  readonly location: 'inside-inner-span' | 'between-rollers';
  /** Moment there over the largest moment, dimensionless, > 0 to 1. */
  readonly momentRatio: number;
};

/**
 * Where along a four-point bar a fracture lies, and the part of the moment that acted there. Method `validity.breakLocation4`.
 *
 * `xMm` from mid-span, signed. At an inner roller the break counts as inside; at an outer roller and beyond there is no
 * strength to be had, and it is refused.
 * Source: trade practice; the moment ratio from beam theory.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-span, negative-inner-span,
 * inner-span-not-less-than-outer, position-outside-span
 * @example breakLocation({ outerSpanMm: 40, innerSpanMm: 20, xMm: -12.5 }) // between-rollers, 0.75
 */
export function breakLocation(bar: FourPointSpans & { readonly xMm: number }): BreakLocation {
  const { outerSpanMm, innerSpanMm, xMm } = bar;
  requireFinite({ outerSpanMm, innerSpanMm, xMm });
  requireFourPointSpans(bar);
  requireThat(Math.abs(xMm) < outerSpanMm / 2, 'position-outside-span', 'xMm');
  const isInside = Math.abs(xMm) <= innerSpanMm / 2;
  return { location: isInside ? 'inside-inner-span' : 'between-rollers', momentRatio: fourPointMomentRatio(bar) };
}
