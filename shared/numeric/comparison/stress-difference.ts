import { requireFinite, requireThat } from '../require.ts';

export type StressPair = {
  readonly stress1MPa: number;
  /** Standard uncertainty, MPa, > 0. */
  readonly u1MPa: number;
  readonly stress2MPa: number;
  /** Standard uncertainty, MPa, > 0. */
  readonly u2MPa: number;
  /** From inputs both share, MPa²; 0 when they share none. */
  readonly covarianceMPa2: number;
};

/**
 * How far two stresses lie apart, dimensionless: ζ in standard uncertainties of their difference, and E_n = ζ/2, which
 * sets it against U (k = 2). Methods `compare.pair` and `compare.pair.correlated`.
 * Source: ζ = (σ₁ − σ₂)/√(u₁² + u₂² − 2 cov), ISO 13528.
 * @throws OutsideDomain, the first that applies: non-finite-input, missing-uncertainty (u ≤ 0),
 * outside-validity-range (covariance so large that the difference has no uncertainty)
 */
export function stressDifference(pair: StressPair): { readonly zeta: number; readonly en: number } {
  const { stress1MPa, u1MPa, stress2MPa, u2MPa, covarianceMPa2 } = pair;
  requireFinite({ ...pair });
  requireThat(u1MPa > 0, 'missing-uncertainty', 'u1MPa');
  requireThat(u2MPa > 0, 'missing-uncertainty', 'u2MPa');
  const variance = u1MPa ** 2 + u2MPa ** 2 - 2 * covarianceMPa2;
  requireThat(variance > 0, 'outside-validity-range', 'covarianceMPa2');
  const zeta = (stress1MPa - stress2MPa) / Math.sqrt(variance);
  return { zeta, en: zeta / 2 };
}
