import type { StressView } from '#shared/contracts/estimates.ts';
import { coverageFactor, formatEstimated } from '#shared/wording/quantity.ts';

/** A stress with its interval: u, U at k = 2, and both as text. */
export function presentStress(value: number, standardUncertainty: number): StressView {
  return {
    value,
    standardUncertainty,
    expandedUncertainty: coverageFactor * standardUncertainty,
    unit: 'MPa',
    text: formatEstimated({ value, standardUncertainty, unit: 'MPa' }),
  };
}
