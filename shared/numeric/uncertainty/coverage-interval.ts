export type Interval = { readonly low: number; readonly high: number };

export type DrawsSummary = {
  readonly draws: number;
  readonly mean: number;
  /** n − 1 in the denominator. */
  readonly sd: number;
  /** Share that the intervals hold, 0 to 1. */
  readonly coverage: number;
  /** As much left out below as above. */
  readonly symmetric: Interval;
  /** The narrowest that holds as much. */
  readonly shortest: Interval;
};

/**
 * Mean, spread and coverage intervals of drawn values. `values`: n ≥ 2, any order, not changed; `coverage` above 0, below 1.
 * Source: JCGM 101:2008, 7.6 and 7.7: y(r) to y(r + q) of the sorted values, q = pM.
 */
export function summariseDraws(values: Float64Array, coverage: number): DrawsSummary {
  const draws = values.length;
  let sum = 0;
  for (const value of values) sum += value;
  const mean = sum / draws;
  let squares = 0;
  for (const value of values) squares += (value - mean) ** 2;
  const sd = Math.sqrt(squares / (draws - 1));
  const sorted = Float64Array.from(values).sort();
  const within = Math.min(draws - 1, Math.floor(coverage * draws + 0.5));
  const first = Math.max(1, Math.floor((draws - within + 1) / 2));
  return {
    draws,
    mean,
    sd,
    coverage,
    symmetric: interval(sorted, first - 1, within),
    shortest: interval(sorted, shortestFrom(sorted, within), within),
  };
}

function interval(sorted: Float64Array, from: number, within: number): Interval {
  return { low: sorted[from] ?? Number.NaN, high: sorted[from + within] ?? Number.NaN };
}

function shortestFrom(sorted: Float64Array, within: number): number {
  let from = 0;
  let width = Number.POSITIVE_INFINITY;
  for (let start = 0; start + within < sorted.length; start += 1) {
    const here = (sorted[start + within] ?? Number.NaN) - (sorted[start] ?? Number.NaN);
    if (here < width) [from, width] = [start, here];
  }
  return from;
}
