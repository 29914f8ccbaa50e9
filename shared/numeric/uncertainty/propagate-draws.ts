import { randomFromSeed } from '../random/random-source.ts';
import { requireThat } from '../require.ts';
import { summariseDraws, type DrawsSummary } from './coverage-interval.ts';
import { drawFrom, type Spread } from './spread.ts';

/** A quantity reckoned from drawn ones; NaN where it cannot be. `values`: one each, in the order of the spreads. */
export type Model = (values: Float64Array) => number;

export type Drawing = {
  readonly spreads: readonly Spread[];
  readonly models: readonly Model[];
  /** How many times all are drawn, ≥ 2. */
  readonly draws: number;
  /** Share that the intervals shall hold, above 0 and below 1. */
  readonly coverage: number;
  readonly seed: number | bigint;
};

export type DrawsDone = { readonly done: number; readonly of: number };

export type Drawn = {
  /** One a model, in their order. */
  readonly summaries: readonly DrawsSummary[];
  /** Of each pair of models, first less second: 0–1, 0–2, …, 1–2, … */
  readonly differences: readonly { readonly of: readonly [number, number]; readonly summary: DrawsSummary }[];
  /** Draws for which a model gave no number; they are left out everywhere. */
  readonly leftOut: number;
};

// Small enough to tell of progress several times a second.
const drawsInBlock = 10_000;

/**
 * Propagates spreads through models, in blocks, so that a caller may tell how far it is; each yields how many are done.
 *
 * All models see the same draw, so what they share is shared. One stream of chance: the digits do not depend on blocks.
 * Source: JCGM 101:2008, 7.
 * @throws OutsideDomain as `drawFrom`; too-few-points (draws < 2, or fewer than two that gave a number);
 * outside-validity-range (coverage)
 */
export function* drawInBlocks(drawing: Drawing): Generator<DrawsDone, Drawn> {
  const { spreads, models, draws, coverage, seed } = drawing;
  requireThat(Number.isSafeInteger(draws) && draws >= 2, 'too-few-points', 'draws');
  requireThat(coverage > 0 && coverage < 1, 'outside-validity-range', 'coverage');
  const random = randomFromSeed(seed);
  const drawers = spreads.map(drawFrom);
  const values = new Float64Array(spreads.length);
  const results = models.map(() => new Float64Array(draws));
  let kept = 0;
  for (let done = 1; done <= draws; done += 1) {
    for (let index = 0; index < drawers.length; index += 1) values[index] = drawers[index]?.(random) ?? Number.NaN;
    if (allReckoned(models, values, results, kept)) kept += 1;
    if (done % drawsInBlock === 0 || done === draws) yield { done, of: draws };
  }
  requireThat(kept >= 2, 'too-few-points', 'draws');
  return summarised(
    results.map((each) => each.subarray(0, kept)),
    coverage,
    draws - kept,
  );
}

/** As `drawInBlocks`, all at once. */
export function propagateDraws(drawing: Drawing): Drawn {
  const blocks = drawInBlocks(drawing);
  for (;;) {
    const step = blocks.next();
    if (step.done) return step.value;
  }
}

function allReckoned(models: readonly Model[], values: Float64Array, results: Float64Array[], at: number): boolean {
  let sound = true;
  for (let index = 0; index < models.length; index += 1) {
    const value = models[index]?.(values) ?? Number.NaN;
    const result = results[index];
    if (result) result[at] = value;
    sound &&= Number.isFinite(value);
  }
  return sound;
}

function summarised(results: readonly Float64Array[], coverage: number, leftOut: number): Drawn {
  const pairs = results.flatMap((one, first) =>
    results.slice(first + 1).map((other, index) => ({ one, other, of: [first, first + 1 + index] as const })),
  );
  return {
    summaries: results.map((each) => summariseDraws(each, coverage)),
    differences: pairs.map(({ one, other, of }) => ({
      of,
      summary: summariseDraws(
        one.map((value, index) => value - (other[index] ?? Number.NaN)),
        coverage,
      ),
    })),
    leftOut,
  };
}
