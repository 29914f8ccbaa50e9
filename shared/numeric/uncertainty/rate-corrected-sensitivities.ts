import { rateCorrectedStressMPa, type RateChange } from '../slow-growth/rate-corrected-stress.ts';

/**
 * Change of the rate-corrected stress per unit of stress (1), rates (MPa per MPa/s) and exponent (MPa).
 * Source: derivatives of sigma₁ (rate₂/rate₁)^(1/(n+1)). Refuses as `scg.rateCorrection`.
 */
export function rateCorrectedSensitivities(change: RateChange) {
  const stressMPa = rateCorrectedStressMPa(change);
  const { rateMPaPerS, targetRateMPaPerS, exponent } = change;
  const perLogRate = stressMPa / (exponent + 1);
  return {
    stress: stressMPa / change.stressMPa,
    rate: -perLogRate / rateMPaPerS,
    targetRate: perLogRate / targetRateMPaPerS,
    n: (-perLogRate * Math.log(targetRateMPaPerS / rateMPaPerS)) / (exponent + 1),
  };
}
