import { incompleteBeta } from './incomplete-beta.ts';
import { inverseNormal } from './inverse-normal.ts';

export type StudentT = { readonly t: number; readonly degreesOfFreedom: number };

/**
 * Chance that Student's t lies further from 0 than `t`, either way, 0 to 1. Degrees of freedom > 0.
 * Source: I_x(ν/2, ½) with x = ν/(ν + t²).
 */
export function twoSidedP({ t, degreesOfFreedom }: StudentT): number {
  return incompleteBeta({ x: degreesOfFreedom / (degreesOfFreedom + t ** 2), a: degreesOfFreedom / 2, b: 0.5 });
}

/**
 * Quantile of Student's t, `probability` above 0 and below 1; accurate to about 1e-12.
 * Source: the two-sided chance above, inverted by halving in ln t.
 * @example studentTQuantile({ probability: 0.975, degreesOfFreedom: 6 }) // 2.4469…
 */
export function studentTQuantile(of: { readonly probability: number; readonly degreesOfFreedom: number }): number {
  const { probability, degreesOfFreedom } = of;
  if (probability === 0.5) return 0;
  if (probability < 0.5) return -studentTQuantile({ probability: 1 - probability, degreesOfFreedom });
  // t has heavier tails than the normal, so its quantile is never smaller
  let low = inverseNormal(probability);
  let high = 2 * low;
  const beyond = 2 * (1 - probability);
  while (twoSidedP({ t: high, degreesOfFreedom }) > beyond) high *= 2;
  while (high - low > 1e-14 * high) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    if (twoSidedP({ t: middle, degreesOfFreedom }) > beyond) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
