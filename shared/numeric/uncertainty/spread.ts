import type { RandomSource } from '../random/random-source.ts';
import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';

/** How a quantity is spread about what is known of it; all figures in its own unit. */
export type Spread =
  | { readonly kind: 'exact'; readonly value: number }
  | { readonly kind: 'normal'; readonly mean: number; readonly sd: number }
  /** Equally likely anywhere within ± half-width. */
  | { readonly kind: 'rectangular'; readonly middle: number; readonly halfWidth: number }
  /** Likeliest in the middle, falling in a line to nothing at ± half-width. */
  | { readonly kind: 'triangular'; readonly middle: number; readonly halfWidth: number }
  /** Of a quantity that is never 0 or less; mean and sd are those of the quantity, not of its logarithm. */
  | { readonly kind: 'lognormal'; readonly mean: number; readonly sd: number }
  /** Repeated readings, n ≥ 2: the mean with Student's t on n − 1 degrees of freedom. */
  | { readonly kind: 'readings'; readonly values: readonly number[] };

/** Gives the next value of a quantity. A spread takes the same number of random numbers at each draw. */
export type Draw = (random: RandomSource) => number;

/**
 * How values of a spread are drawn; checks it once, so that a million draws need not.
 * Source: JCGM 101:2008, 6.4.
 * @throws OutsideDomain, the first that applies: non-finite-input, negative-uncertainty, non-positive-dimension (lognormal
 * mean), too-few-points (readings)
 */
export function drawFrom(spread: Spread): Draw {
  switch (spread.kind) {
    case 'exact':
      requireFinite({ value: spread.value });
      return () => spread.value;
    case 'normal': {
      const { mean, sd } = spread;
      requireSpread({ mean, sd });
      return (random) => mean + sd * random.normal();
    }
    case 'rectangular': {
      const { middle, halfWidth } = spread;
      requireSpread({ mean: middle, sd: halfWidth });
      return (random) => middle + halfWidth * (2 * random.uniform() - 1);
    }
    case 'triangular': {
      const { middle, halfWidth } = spread;
      requireSpread({ mean: middle, sd: halfWidth });
      return (random) => middle + halfWidth * (random.uniform() + random.uniform() - 1);
    }
    case 'lognormal':
      return lognormal(spread);
    case 'readings':
      return ofReadings(spread.values);
  }
}

function requireSpread(of: { readonly mean: number; readonly sd: number }): void {
  requireFinite(of);
  requireNotNegative({ sd: of.sd }, 'negative-uncertainty');
}

function lognormal({ mean, sd }: { readonly mean: number; readonly sd: number }): Draw {
  requireSpread({ mean, sd });
  requirePositive({ mean }, 'non-positive-dimension');
  const variance = Math.log1p((sd / mean) ** 2);
  const middle = Math.log(mean) - variance / 2;
  return (random) => Math.exp(middle + Math.sqrt(variance) * random.normal());
}

function ofReadings(values: readonly number[]): Draw {
  requireThat(values.length >= 2, 'too-few-points', 'values');
  for (const value of values) requireFinite({ values: value });
  const n = values.length;
  const mean = values.reduce((sum, value) => sum + value, 0) / n;
  const sd = Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (n - 1));
  return (random) => mean + (sd / Math.sqrt(n)) * studentT(random, n - 1);
}

/** A normal deviate over the root of a mean square of as many others; pairs of squares are drawn as exponentials. */
function studentT(random: RandomSource, degreesOfFreedom: number): number {
  const deviate = random.normal();
  let squares = degreesOfFreedom % 2 === 1 ? random.normal() ** 2 : 0;
  for (let pair = 0; pair < Math.floor(degreesOfFreedom / 2); pair += 1) squares -= 2 * Math.log1p(-random.uniform());
  return deviate / Math.sqrt(squares / degreesOfFreedom);
}
