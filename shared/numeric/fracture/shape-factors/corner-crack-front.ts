import { cornerCrackAt } from './corner-crack-at.ts';
import { cornerCrackRatios, type CornerCrack } from './corner-crack.ts';
import type { FrontSummary } from './crack-front.ts';
import { summariseFront } from './front-summary.ts';

/**
 * Shape factors of a quarter-elliptical corner crack, √π inside: on the face along the width (first end), on the face along
 * the depth (second end), and the largest on the whole front. Method `Y.corner.newmanRaju`. In bending they go with the
 * outer-fibre stress.
 *
 * Holds for 0.2 ≤ a/c ≤ 2 (from memory), a/t < 1 and c/b < 0.5 with b the full width.
 * Source: Newman and Raju, NASA TM-85793 (1984), equations 37 to 51, coefficients as in three public implementations.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-flaw-size,
 * flaw-deeper-than-section (a ≥ t), outside-validity-range (c/b ≥ 0.5, a/c < 0.2 or > 2)
 * @example cornerCrackFront({ flawDepthMm: 0.1, flawLengthMm: 0.1, thicknessMm: 3, widthMm: 4, mode: 'bending' }).largestFactor // 1.2613…
 */
export function cornerCrackFront(crack: CornerCrack): FrontSummary {
  const ratios = cornerCrackRatios(crack);
  return summariseFront((angleRad) => cornerCrackAt(ratios, crack.mode, angleRad).shapeFactor);
}
