import { mirrorPoints, type MirrorLot } from './mirror-lot.ts';

export type FittedThroughOrigin = {
  readonly mirrorConstantMPaRootM: number;
  readonly standardUncertaintyMPaRootM: number;
  /** Spread of the stresses about the line, MPa. */
  readonly residualSdMPa: number;
};

/**
 * Mirror constant of a lot by the line σ = A/√R through the origin. Method `mirror.fit.origin`, the one to quote unless
 * the fits with intercept or exponent say otherwise. n ≥ 2 mirrors.
 *
 * Holds for stress-free parts with one boundary criterion. Rounding only.
 * Source: least squares of sigma on x = R^(−1/2): A = Σ sigma x / Σ x², s² = Σ (sigma − A x)²/(n − 1), u(A) = s/√Σx².
 * @throws OutsideDomain as `mirrorPoints`
 * @example fitThroughOrigin({ radiiMm: [0.1, 0.4], stressesMPa: [200, 100] }).mirrorConstantMPaRootM // 2
 */
export function fitThroughOrigin(lot: MirrorLot): FittedThroughOrigin {
  const points = mirrorPoints(lot, 2);
  const sumOfSquares = points.reduce((sum, { perRootMetre }) => sum + perRootMetre ** 2, 0);
  const sumOfProducts = points.reduce((sum, { perRootMetre, stressMPa }) => sum + perRootMetre * stressMPa, 0);
  const mirrorConstantMPaRootM = sumOfProducts / sumOfSquares;
  const residuals = points.map((point) => point.stressMPa - mirrorConstantMPaRootM * point.perRootMetre);
  const residualSdMPa = Math.sqrt(residuals.reduce((sum, each) => sum + each ** 2, 0) / (points.length - 1));
  return {
    mirrorConstantMPaRootM,
    standardUncertaintyMPaRootM: residualSdMPa / Math.sqrt(sumOfSquares),
    residualSdMPa,
  };
}
