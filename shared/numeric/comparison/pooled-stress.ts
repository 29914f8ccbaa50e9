import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { solveLinear } from '../special-functions/solve-linear.ts';

export type PooledStress = {
  readonly stressMPa: number;
  readonly standardUncertaintyMPa: number;
  /** Σ over the inverse covariances of the deviations, dimensionless, n − 1 degrees of freedom. */
  readonly chiSquared: number;
};

/**
 * Weighted mean of stresses with shared inputs, and how badly they fit it. `stressesMPa`: n ≥ 2;
 * `covariancesMPa2`: n × n, u² on the diagonal.
 * Source: generalised least squares for one common value; with no shared inputs w = 1/u².
 * @throws OutsideDomain, the first that applies: too-few-points, non-finite-input, missing-uncertainty,
 * outside-validity-range (covariances that no set of inputs can have)
 */
export function pooledStress(of: {
  readonly stressesMPa: readonly number[];
  readonly covariancesMPa2: readonly (readonly number[])[];
}): PooledStress {
  const { stressesMPa, covariancesMPa2 } = of;
  requireThat(stressesMPa.length >= 2, 'too-few-points', 'stressesMPa');
  for (const stress of stressesMPa) requireFinite({ stressesMPa: stress });
  for (const covariance of covariancesMPa2.flat()) requireFinite({ covariancesMPa2: covariance });
  covariancesMPa2.forEach((row, index) => requirePositive({ covariancesMPa2: row[index] ?? 0 }, 'missing-uncertainty'));
  const weights = solved(
    covariancesMPa2,
    stressesMPa.map(() => 1),
  );
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  requireThat(total > 0, 'outside-validity-range', 'covariancesMPa2');
  const stressMPa = dot(weights, stressesMPa) / total;
  const deviations = stressesMPa.map((stress) => stress - stressMPa);
  const chiSquared = dot(deviations, solved(covariancesMPa2, deviations));
  return { stressMPa, standardUncertaintyMPa: 1 / Math.sqrt(total), chiSquared };
}

function solved(matrix: readonly (readonly number[])[], right: readonly number[]): number[] {
  const solution = solveLinear(matrix, right);
  requireThat(solution !== undefined, 'outside-validity-range', 'covariancesMPa2');
  return solution ?? [];
}

function dot(one: readonly number[], other: readonly number[]): number {
  return one.reduce((sum, value, index) => sum + value * (other[index] ?? 0), 0);
}
