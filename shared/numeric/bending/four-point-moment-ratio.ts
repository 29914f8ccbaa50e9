/**
 * Bending moment at x over the largest moment in four-point bending, dimensionless, 0 to 1: level between the inner rollers
 * and on them, falling in a line to the outer ones. For spans and a position already found sound.
 * @example fourPointMomentRatio({ outerSpanMm: 40, innerSpanMm: 20, xMm: -12.5 }) // 0.75
 */
export function fourPointMomentRatio(at: {
  readonly outerSpanMm: number;
  readonly innerSpanMm: number;
  readonly xMm: number;
}): number {
  const awayMm = Math.abs(at.xMm);
  if (awayMm <= at.innerSpanMm / 2) return 1;
  return (at.outerSpanMm - 2 * awayMm) / (at.outerSpanMm - at.innerSpanMm);
}
