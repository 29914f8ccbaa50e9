import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { rootMetresFromMm } from '../units/root-metres.ts';

export type CrackedPore = {
  /** Radius of the pore, mm, > 0. */
  readonly poreRadiusMm: number;
  /** Length of the crack all round it, mm, > 0; often one grain. */
  readonly crackLengthMm: number;
  /** Poisson's ratio, dimensionless, 0 to below 0.5. */
  readonly poissonRatio: number;
};

export type PoreBracket = {
  /** Stress at the wall of the pore over the stress far away, dimensionless. */
  readonly concentration: number;
  /** K over stress, √m, as a short crack in the raised stress at the wall. */
  readonly shortCrackRootM: number;
  /** K over stress, √m, as a round crack of the whole radius. */
  readonly pennyRootM: number;
  /** The smaller of both. */
  readonly smallerRootM: number;
};

/**
 * Stress intensity over stress of a round pore with a crack all round, √m, as the smaller of two bounds.
 * Method `flaw.pore.bracket`. K = this × the stress in MPa.
 *
 * An interpolation of practice, not a published solution; the bounds cross near a crack of 0.085 of the radius.
 * Source: 1.1215 Kt √(π ℓ) with Goodier's cavity, Kt = (27 − 15ν) / (2 (7 − 5ν)), from memory; (2/√π) √(R + ℓ).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-flaw-size, poisson-out-of-range
 * @example poreBracket({ poreRadiusMm: 0.04, crackLengthMm: 0.008, poissonRatio: 0.25 }).smallerRootM // 0.0078176…
 */
export function poreBracket(pore: CrackedPore): PoreBracket {
  const { poreRadiusMm, crackLengthMm, poissonRatio } = pore;
  requireFinite({ poreRadiusMm, crackLengthMm, poissonRatio });
  requirePositive({ poreRadiusMm, crackLengthMm }, 'non-positive-flaw-size');
  requireThat(poissonRatio >= 0 && poissonRatio < 0.5, 'poisson-out-of-range', 'poissonRatio');
  const concentration = (27 - 15 * poissonRatio) / (2 * (7 - 5 * poissonRatio));
  const shortCrackRootM = 1.1215 * concentration * Math.sqrt(Math.PI) * rootMetresFromMm(crackLengthMm);
  const pennyRootM = (2 / Math.sqrt(Math.PI)) * rootMetresFromMm(poreRadiusMm + crackLengthMm);
  return { concentration, shortCrackRootM, pennyRootM, smallerRootM: Math.min(shortCrackRootM, pennyRootM) };
}
