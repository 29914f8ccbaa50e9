import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';

export type OnStuckBearings = {
  /** Between bar and bearing, dimensionless, ≥ 0. */
  readonly frictionCoefficient: number;
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
};

/**
 * Relative error of the three-point stress where the bearings cannot roll, dimensionless, ≤ 0: the true stress is lower.
 * Method `error.friction3`.
 *
 * An upper bound: full sliding at both supports.
 * Source: statics; −μd/L from the moment and −μd/(3L) from the axial compression.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * outside-validity-range for the friction
 * @example threePointFrictionError({ frictionCoefficient: 0.2, depthMm: 3, outerSpanMm: 40 }) // −0.02
 */
export function threePointFrictionError(bar: OnStuckBearings & { readonly outerSpanMm: number }): number {
  const { frictionCoefficient, depthMm, outerSpanMm } = bar;
  requireFinite({ frictionCoefficient, depthMm, outerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  requireNotNegative({ frictionCoefficient }, 'outside-validity-range');
  return (-4 * frictionCoefficient * depthMm) / (3 * outerSpanMm);
}
