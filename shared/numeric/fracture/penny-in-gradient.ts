import { requireFinite, requirePositive } from '../require.ts';
import { rootMetresFromMm } from '../units/root-metres.ts';

export type PennyInGradient = {
  /** At the centre of the flaw, MPa, > 0. */
  readonly stressAtCentreMPa: number;
  /** Rise of the stress towards the tensile face, MPa/mm. */
  readonly gradientMPaPerMm: number;
  /** Radius of the flaw, mm, > 0. */
  readonly radiusMm: number;
};

/**
 * Largest and smallest stress intensity on the front of a round crack in a stress that changes in a line, MPa√m; the
 * largest is at the side of the higher stress. Method `K.penny.gradient`.
 *
 * Holds for a crack small against its cover, open all round (the smallest not below 0). Rounding only.
 * Source: K(θ) = (2/√π) √a [sigma_c + ⅔ a g cos θ], from the weight function of the penny crack.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-flaw-size, non-positive-stress
 * @example pennyInGradient({ stressAtCentreMPa: 400, gradientMPaPerMm: 800 / 3, radiusMm: 0.05 }).largestMPaRootM // 3.26246…
 */
export function pennyInGradient(penny: PennyInGradient): {
  readonly largestMPaRootM: number;
  readonly smallestMPaRootM: number;
} {
  const { stressAtCentreMPa, gradientMPaPerMm, radiusMm } = penny;
  requireFinite({ stressAtCentreMPa, gradientMPaPerMm, radiusMm });
  requirePositive({ radiusMm }, 'non-positive-flaw-size');
  requirePositive({ stressAtCentreMPa }, 'non-positive-stress');
  const root = (2 / Math.sqrt(Math.PI)) * rootMetresFromMm(radiusMm);
  const edgeMPa = (2 / 3) * radiusMm * Math.abs(gradientMPaPerMm);
  return {
    largestMPaRootM: root * (stressAtCentreMPa + edgeMPa),
    smallestMPaRootM: root * (stressAtCentreMPa - edgeMPa),
  };
}
