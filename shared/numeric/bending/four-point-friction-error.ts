import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';
import type { OnStuckBearings } from './three-point-friction-error.ts';

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
