import type { FrontSummary } from './crack-front.ts';
import { summariseFront } from './front-summary.ts';
import { surfaceCrackAt } from './surface-crack-at.ts';
import { surfaceCrackRatios, type SurfaceCrack } from './surface-crack.ts';

/**
 * Shape factors of a semi-elliptical surface crack, √π inside: at the surface (first end), at the deepest point (second
 * end), and the largest on the whole front. Method `Y.surface.newmanRaju`. In bending they go with the outer-fibre stress.
 *
 * Holds for 0.2 ≤ a/c ≤ 2 and a/t ≤ 0.8 within ±5 % of finite elements; shallower and deeper cracks are given within the
 * limits below, with no accuracy stated. The value at the surface is a fit, not an exact limit.
 * Source: Newman and Raju, NASA TM-83200 (1981) and TM-85793 (1984), coefficients as in the public implementations.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-flaw-size,
 * flaw-deeper-than-section (a ≥ t), outside-validity-range (c/b ≥ 0.5, a/c > 2, or a/c < 0.2 with a/t ≥ 1.25 (a/c + 0.6))
 * @example surfaceCrackFront({ flawDepthMm: 0.1, flawHalfLengthMm: 0.2, thicknessMm: 3, halfWidthMm: 2, mode: 'bending' }).largestFactor // 1.5219…
 */
export function surfaceCrackFront(crack: SurfaceCrack): FrontSummary {
  const ratios = surfaceCrackRatios(crack);
  return summariseFront((angleRad) => surfaceCrackAt(ratios, crack.mode, angleRad).shapeFactor);
}
