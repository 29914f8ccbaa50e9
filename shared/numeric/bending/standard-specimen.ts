import { requireFinite, requirePositive } from '../require.ts';
import { requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

type BarOnSpans = FourPointSpans & {
  /** Section across the load, mm, > 0. */
  readonly widthMm: number;
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
};

type Size = {
  readonly size: string;
  readonly depthMm: number;
  readonly widthMm: number;
  readonly outerSpanMm: number;
  /** 0 stands for three points. */
  readonly innerSpansMm: readonly number[];
  /** Of depth and width, mm, either way. */
  readonly withinMm: number;
};

// Size B and its 40 mm span from the scope of ASTM C1161-13, which lets half and twice of it be used; section tolerances
// from memory.
const c1161Sizes: readonly Size[] = [
  { size: 'A', depthMm: 1.5, widthMm: 2, outerSpanMm: 20, innerSpansMm: [10, 0], withinMm: 0.05 },
  { size: 'B', depthMm: 3, widthMm: 4, outerSpanMm: 40, innerSpansMm: [20], withinMm: 0.13 },
  { size: 'C', depthMm: 6, widthMm: 8, outerSpanMm: 80, innerSpansMm: [40, 0], withinMm: 0.13 },
];
// Spans from the scope of EN 843-1:2006; section A from memory. No tolerance at hand: as for the C1161 size nearest.
const en843Sizes: readonly Size[] = [
  { size: 'A', depthMm: 2, widthMm: 2.5, outerSpanMm: 20, innerSpansMm: [10], withinMm: 0.05 },
  { size: 'B', depthMm: 3, widthMm: 4, outerSpanMm: 40, innerSpansMm: [20], withinMm: 0.13 },
];
// The short span of ISO 14704 is named in a note of EN 843-1:2006; its inner span is from memory.
const iso14704Short: Size = {
  size: '30',
  depthMm: 3,
  widthMm: 4,
  outerSpanMm: 30,
  innerSpansMm: [10],
  withinMm: 0.13,
};
// How far a measured span may be from the nominal one and still be meant: from memory of C1161.
const spanWithinMm = 0.1;

export type StandardSpecimen = {
  /** A, B, C or none. */
  readonly c1161Size: string;
  /** Whether it is the short-span bar of ISO 14704. */
  readonly iso14704Span30: boolean;
  /** A, B or none. */
  readonly en843Size: string;
};

/**
 * Which standard bars a bar on its spans is. Method `validity.specimen`.
 *
 * Goes by section and spans only; length, chamfers and finish are not looked at.
 * Source: ASTM C1161-13, EN 843-1:2006 and ISO 14704, as noted at the tables above.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer
 * @example standardSpecimen({ widthMm: 4, depthMm: 3, outerSpanMm: 40, innerSpanMm: 20 }).c1161Size // 'B'
 */
export function standardSpecimen(bar: BarOnSpans): StandardSpecimen {
  const { widthMm, depthMm, outerSpanMm, innerSpanMm } = bar;
  requireFinite({ widthMm, depthMm, outerSpanMm, innerSpanMm });
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  const sizeAmong = (sizes: readonly Size[]) => sizes.find((size) => isOfSize(bar, size))?.size ?? 'none';
  return {
    c1161Size: sizeAmong(c1161Sizes),
    iso14704Span30: isOfSize(bar, iso14704Short),
    en843Size: sizeAmong(en843Sizes),
  };
}

function isOfSize(bar: BarOnSpans, size: Size): boolean {
  const isNear = (measuredMm: number, nominalMm: number, withinMm: number) =>
    Math.abs(measuredMm - nominalMm) <= withinMm * (1 + 1e-9);
  return (
    isNear(bar.depthMm, size.depthMm, size.withinMm) &&
    isNear(bar.widthMm, size.widthMm, size.withinMm) &&
    isNear(bar.outerSpanMm, size.outerSpanMm, spanWithinMm) &&
    size.innerSpansMm.some((innerMm) => isNear(bar.innerSpanMm, innerMm, spanWithinMm))
  );
}
