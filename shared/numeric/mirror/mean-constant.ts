import { mirrorPoints, type MirrorLot } from './mirror-lot.ts';

export type MeanConstant = {
  readonly meanMPaRootM: number;
  /** Spread of the single constants, n − 1 in the denominator. */
  readonly sdMPaRootM: number;
  /** Of the mean: sd/√n. */
  readonly standardUncertaintyMPaRootM: number;
  /** The line ln σ = ln A − ½ ln R with its slope held. */
  readonly geometricMeanMPaRootM: number;
};

/**
 * Mirror constant of a lot as the mean of σ√R, mirror by mirror. Method `mirror.fit.mean`. n ≥ 2 mirrors.
 *
 * Holds as `mirror.fit.origin`, and weighs every mirror alike in relative terms. Rounding only.
 * Source: A_j = sigma_j √R_j, mean and standard deviation.
 * @throws OutsideDomain as `mirrorPoints`
 * @example meanConstant({ radiiMm: [0.1, 0.4], stressesMPa: [200, 100] }).meanMPaRootM // 2
 */
export function meanConstant(lot: MirrorLot): MeanConstant {
  const constants = mirrorPoints(lot, 2).map(({ stressMPa, perRootMetre }) => stressMPa / perRootMetre);
  const n = constants.length;
  const mean = constants.reduce((sum, each) => sum + each, 0) / n;
  const sd = Math.sqrt(constants.reduce((sum, each) => sum + (each - mean) ** 2, 0) / (n - 1));
  const logarithm = constants.reduce((sum, each) => sum + Math.log(each), 0) / n;
  return {
    meanMPaRootM: mean,
    sdMPaRootM: sd,
    standardUncertaintyMPaRootM: sd / Math.sqrt(n),
    geometricMeanMPaRootM: Math.exp(logarithm),
  };
}
