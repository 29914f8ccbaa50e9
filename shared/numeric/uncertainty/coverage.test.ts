import { describe, expect, it } from 'vitest';
import { randomFromSeed } from '../random/random-source.ts';
import { seedOfTask } from '../random/split-mix-64.ts';
import { propagateDraws } from './propagate-draws.ts';
import { propagateUncertainty } from './propagate.ts';

// Radii 0.4 and 0.6 mm read with 0.02 and 0.03 mm, and their mean: linear, so that both ways must hold what they say.
const truth = [0.4, 0.6] as const;
const sd = [0.02, 0.03] as const;
const trials = 20_000;
// four standard errors of a share near 95 % in 20 000 trials: 4√(0.95 × 0.05/20 000) = 0.6 %
const tolerance = 0.006;

function shareOfTrials(holds: (left: number, right: number, trial: number) => boolean): number {
  const random = randomFromSeed(20260504);
  let held = 0;
  for (let trial = 0; trial < trials; trial += 1) {
    const left = truth[0] + sd[0] * random.normal();
    const right = truth[1] + sd[1] * random.normal();
    if (holds(left, right, trial)) held += 1;
  }
  return held / trials;
}

describe('an interval over 20 000 trials', () => {
  it('of ± 2u holds the true value in 95.45 % of them', () => {
    const share = shareOfTrials((left, right) => {
      const { estimated } = propagateUncertainty({
        value: (left + right) / 2,
        unit: 'mm',
        terms: [
          { input: 'left', sensitivity: 0.5, standardUncertainty: sd[0] },
          { input: 'right', sensitivity: 0.5, standardUncertainty: sd[1] },
        ],
      });
      return Math.abs(estimated.value - 0.5) <= 2 * estimated.standardUncertainty;
    });
    expect(Math.abs(share - 0.9545)).toBeLessThan(tolerance);
  });

  it('of 95 % drawn by chance holds the true value in 95 % of them', { timeout: 60_000 }, () => {
    const mean = (values: Float64Array) => ((values[0] ?? Number.NaN) + (values[1] ?? Number.NaN)) / 2;
    const share = shareOfTrials((left, right, trial) => {
      const [summary] = propagateDraws({
        spreads: [
          { kind: 'normal', mean: left, sd: sd[0] },
          { kind: 'normal', mean: right, sd: sd[1] },
        ],
        models: [mean],
        // so few that the ends are uncertain by a ninth of u, which costs 0.15 % of coverage
        draws: 600,
        coverage: 0.95,
        seed: seedOfTask(4n, trial),
      }).summaries;
      return summary !== undefined && summary.symmetric.low <= 0.5 && 0.5 <= summary.symmetric.high;
    });
    expect(Math.abs(share - 0.95)).toBeLessThan(tolerance);
  });
});
