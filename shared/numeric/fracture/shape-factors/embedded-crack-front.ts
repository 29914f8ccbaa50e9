import { requireFinite, requirePositive, requireThat } from '../../require.ts';
import type { FrontSummary } from './crack-front.ts';
import { summariseFront } from './front-summary.ts';
import { angularFactor, flawShapeParameter } from './front-terms.ts';

export type EmbeddedCrack = {
  /** Half of the crack along the thickness, mm, > 0; twice it is less than the thickness. */
  readonly flawHalfDepthMm: number;
  /** Half of the crack along the width, mm, at least the half-depth. */
  readonly flawHalfLengthMm: number;
  /** Full thickness of the section, mm, > 0. */
  readonly thicknessMm: number;
  /** Half of the width of the section, mm, > 0; left out for a wide section. */
  readonly halfWidthMm?: number | undefined;
};

/**
 * Shape factors of an elliptical crack in the middle of a plate in tension, √π inside: at the end of the length (first end),
 * at the end of the depth (second end), and the largest on the whole front. Method `Y.embedded.newmanRaju`.
 *
 * Holds for a crack centred in the thickness, a ≤ c. The public copies of the equation differ; this is the form of those
 * that carry the full term, so the confidence is medium. In a thick plate it is the exact ellipse within 0.07 %.
 * Source: Newman and Raju, NASA TM-83200 (1981), TM-85793 (1984).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-flaw-size,
 * flaw-deeper-than-section (2a ≥ t), outside-validity-range (a > c, c/b ≥ 0.5)
 * @example embeddedCrackFront({ flawHalfDepthMm: 0.3, flawHalfLengthMm: 0.3, thicknessMm: 3, halfWidthMm: 2 }).secondEndFactor // 1.13476…
 */
export function embeddedCrackFront(crack: EmbeddedCrack): FrontSummary {
  const { flawHalfDepthMm, flawHalfLengthMm, thicknessMm, halfWidthMm } = crack;
  const given: Record<string, number> = halfWidthMm === undefined ? {} : { halfWidthMm };
  requireFinite({ flawHalfDepthMm, flawHalfLengthMm, thicknessMm, ...given });
  requirePositive({ thicknessMm, ...given }, 'non-positive-dimension');
  requirePositive({ flawHalfDepthMm, flawHalfLengthMm }, 'non-positive-flaw-size');
  requireThat(2 * flawHalfDepthMm < thicknessMm, 'flaw-deeper-than-section', 'flawHalfDepthMm');
  requireThat(flawHalfDepthMm <= flawHalfLengthMm, 'outside-validity-range', 'flawHalfDepthMm');
  const lengthRatio = halfWidthMm === undefined ? 0 : flawHalfLengthMm / halfWidthMm;
  requireThat(lengthRatio < 0.5, 'outside-validity-range', 'flawHalfLengthMm');
  const shape = flawHalfDepthMm / flawHalfLengthMm;
  return summariseFront(centredCrack(shape, (2 * flawHalfDepthMm) / thicknessMm, lengthRatio));
}

/** Y along the front from a/c, 2a/t and c/b. */
function centredCrack(shape: number, depth: number, lengthRatio: number): (angleRad: number) => number {
  const m2 = 0.05 / (0.11 + shape ** 1.5);
  const m3 = 0.29 / (0.23 + shape ** 1.5);
  const width = Math.sqrt(1 / Math.cos((Math.PI / 2) * lengthRatio * Math.sqrt(depth)));
  const level = (1 + m2 * depth ** 2 + m3 * depth ** 4) * width * Math.sqrt(Math.PI / flawShapeParameter(shape));
  const fall = (depth ** 4 * Math.sqrt(2.6 - 2 * depth)) / (1 + 4 * shape);
  return (angleRad) => level * (1 - fall * Math.abs(Math.cos(angleRad))) * angularFactor(shape, angleRad);
}
