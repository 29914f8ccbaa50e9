import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

type OnStuckBearings = {
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

/**
 * Relative error of the four-point stress where the bearings cannot roll, dimensionless, ≤ 0: the true stress is lower.
 * Method `error.friction4`.
 *
 * An upper bound: full sliding at both pairs of rollers; the axial forces cancel between the inner rollers.
 * Source: statics, −μd/a with a = (Lo − Li)/2.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, outside-validity-range for the friction
 * @example fourPointFrictionError({ frictionCoefficient: 0.2, depthMm: 3, outerSpanMm: 40, innerSpanMm: 20 }) // −0.06
 */
export function fourPointFrictionError(bar: OnStuckBearings & FourPointSpans): number {
  const { frictionCoefficient, depthMm, outerSpanMm, innerSpanMm } = bar;
  requireFinite({ frictionCoefficient, depthMm, outerSpanMm, innerSpanMm });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  requireNotNegative({ frictionCoefficient }, 'outside-validity-range');
  return (-frictionCoefficient * depthMm) / momentArmMm(bar);
}
