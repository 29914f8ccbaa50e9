/** A four-point bar or rod as far as its length is concerned, with the stress it would have between the inner rollers. */
export type AlongFourPoint = {
  readonly outerSpanMm: number;
  readonly innerSpanMm: number;
  readonly xMm: number;
  /** Nominal stress times depth ratio, MPa. */
  readonly stressAtDepthMPa: number;
};

/**
 * Change of the four-point stress at an origin per mm of outer span, inner span and x, MPa/mm. Written with the stress per
 * mm of arm, which stays finite at the outer roller.
 * Source: derivatives of sigma_nominal · m(x).
 */
export function alongFourPointBar({ outerSpanMm, innerSpanMm, xMm, stressAtDepthMPa }: AlongFourPoint) {
  const perMm = stressAtDepthMPa / (outerSpanMm - innerSpanMm);
  if (Math.abs(xMm) <= innerSpanMm / 2) return { outerSpan: perMm, innerSpan: -perMm, x: 0 };
  return { outerSpan: perMm, innerSpan: 0, x: -Math.sign(xMm) * 2 * perMm };
}
