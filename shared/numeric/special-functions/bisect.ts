/**
 * Where a function changes from below 0 to 0 or above, between two arguments, to the last digit a number holds.
 * The caller knows that it is below 0 at `from` and not at `to`.
 */
export function bisect(search: {
  readonly from: number;
  readonly to: number;
  readonly of: (argument: number) => number;
}): number {
  let { from: low, to: high } = search;
  // a number has fewer than 1100 halvings between the largest and the smallest
  for (let halving = 0; halving < 1100; halving += 1) {
    const middle = low + (high - low) / 2;
    if (middle === low || middle === high) break;
    if (search.of(middle) < 0) low = middle;
    else high = middle;
  }
  return high;
}
