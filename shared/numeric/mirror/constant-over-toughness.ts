import { requireFinite, requirePositive } from '../require.ts';

/**
 * Mirror constant over toughness that a ratio of mirror radius to flaw size means, dimensionless, > 0. Method
 * `mirror.flawRatio.band`, once for each edge of the mirror.
 *
 * Source: R/c = (A Y/K_Ic)² turned round: A/K_Ic = √(R/c)/Y.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension (ratio), non-positive-shape-factor
 * @example constantOverToughness({ radiusOverFlaw: 10, shapeFactor: 1.29 }) // 2.4513…
 */
export function constantOverToughness(mirror: {
  readonly radiusOverFlaw: number;
  readonly shapeFactor: number;
}): number {
  const { radiusOverFlaw, shapeFactor } = mirror;
  requireFinite({ radiusOverFlaw, shapeFactor });
  requirePositive({ radiusOverFlaw }, 'non-positive-dimension');
  requirePositive({ shapeFactor }, 'non-positive-shape-factor');
  return Math.sqrt(radiusOverFlaw) / shapeFactor;
}
