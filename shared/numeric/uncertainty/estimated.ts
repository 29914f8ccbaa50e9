import type { OurUnit } from '../units/our-units.ts';
import { requireFinite, requireNotNegative } from '../require.ts';

/**
 * A number that is never shown without its interval. It becomes text only through `formatEstimated` in
 * `wording/quantity.ts`, which always writes ± U.
 */
export type Estimated = {
  readonly value: number;
  /** Standard uncertainty, same unit, ≥ 0. */
  readonly standardUncertainty: number;
  readonly unit: OurUnit;
};

/**
 * Makes an estimate.
 * @throws OutsideDomain, the first that applies: non-finite-input, negative-uncertainty
 */
export function estimated(value: number, standardUncertainty: number, unit: OurUnit): Estimated {
  requireFinite({ value, standardUncertainty });
  requireNotNegative({ standardUncertainty }, 'negative-uncertainty');
  return { value, standardUncertainty, unit };
}
