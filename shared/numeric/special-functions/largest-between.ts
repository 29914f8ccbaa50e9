const goldenPart = (Math.sqrt(5) - 1) / 2;

export type Largest = { readonly at: number; readonly value: number };

/**
 * Where a smooth function is largest between two arguments, and how large: a scan in equal steps, then the golden section
 * in the two steps beside the best one. Finds the largest of several peaks when they are wider than a step. An end is
 * given as exactly that end.
 */
export function largestBetween(search: {
  readonly from: number;
  readonly to: number;
  /** Equal steps of the scan, ≥ 1. */
  readonly steps: number;
  readonly of: (argument: number) => number;
}): Largest {
  const { from, to, steps, of } = search;
  const at = (step: number) => (step === steps ? to : from + ((to - from) * step) / steps);
  let best = 0;
  for (let step = 1; step <= steps; step += 1) if (of(at(step)) > of(at(best))) best = step;
  const scanned = { at: at(best), value: of(at(best)) };
  const refined = goldenSection(of, at(Math.max(0, best - 1)), at(Math.min(steps, best + 1)));
  return refined.value > scanned.value ? refined : scanned;
}

function goldenSection(of: (argument: number) => number, from: number, to: number): Largest {
  let [low, high] = [from, to];
  // 60 cuts leave 3e-13 of the bracket
  for (let cut = 0; cut < 60; cut += 1) {
    const [left, right] = [high - goldenPart * (high - low), low + goldenPart * (high - low)];
    if (of(left) > of(right)) high = right;
    else low = left;
  }
  const middle = (low + high) / 2;
  return { at: middle, value: of(middle) };
}
