import { describe, expect, it } from 'vitest';
import { flawStress } from '../methods/flaw-stress.ts';
import { mirrorStress } from '../methods/mirror-stress.ts';
import { randomFromSeed } from '../random/random-source.ts';
import { studentTQuantile } from '../special-functions/student-t.ts';
import { drawMethods } from './draw-methods.ts';
import { drawInBlocks, propagateDraws } from './propagate-draws.ts';
import { drawFrom, type Spread } from './spread.ts';

const itself = (values: Float64Array) => values[0] ?? Number.NaN;
const drawnAlone = (spread: Spread, draws = 100_000) => {
  const [summary] = propagateDraws({ spreads: [spread], models: [itself], draws, coverage: 0.95, seed: 1 }).summaries;
  if (!summary) throw new Error('expected a summary');
  return summary;
};

describe('values drawn from a spread', () => {
  // mean and sd within four standard errors of 100 000 draws: 4/√N = 1.3 %
  it.each<[Spread, number, number]>([
    [{ kind: 'exact', value: 3 }, 3, 0],
    [{ kind: 'normal', mean: 3, sd: 0.1 }, 3, 0.1],
    [{ kind: 'rectangular', middle: 3, halfWidth: 0.3 }, 3, 0.3 / Math.sqrt(3)],
    [{ kind: 'triangular', middle: 3, halfWidth: 0.3 }, 3, 0.3 / Math.sqrt(6)],
    [{ kind: 'lognormal', mean: 3, sd: 0.9 }, 3, 0.9],
  ])('of %o keep its mean and standard deviation', (spread, mean, sd) => {
    const found = drawnAlone(spread);
    expect(Math.abs(found.mean - mean)).toBeLessThanOrEqual(0.013 * sd);
    expect(Math.abs(found.sd - sd)).toBeLessThanOrEqual(0.03 * sd);
  });

  it.each([2, 3, 6])('of %i repeated readings lie as Student says', (n) => {
    const values = Array.from({ length: n }, (_, index) => 10 + index);
    const { mean, symmetric } = drawnAlone({ kind: 'readings', values }, 200_000);
    const middle = 10 + (n - 1) / 2;
    const sd = Math.sqrt(values.reduce((sum, value) => sum + (value - middle) ** 2, 0) / (n - 1));
    const t = studentTQuantile({ probability: 0.975, degreesOfFreedom: n - 1 });
    const half = (t * sd) / Math.sqrt(n);
    if (n > 3) expect(Math.abs(mean - middle)).toBeLessThan(0.01);
    // the end of a heavy tail is known to about 1.5 % from so many draws
    expect(Math.abs((symmetric.high - symmetric.low) / (2 * half) - 1)).toBeLessThan(0.03);
  });

  it('of a lognormal spread are never 0 or less', () => {
    const draw = drawFrom({ kind: 'lognormal', mean: 1, sd: 2 });
    const random = randomFromSeed(3);
    expect(Math.min(...Array.from({ length: 10_000 }, () => draw(random)))).toBeGreaterThan(0);
  });

  it.each<[Spread, string]>([
    [{ kind: 'normal', mean: Number.NaN, sd: 1 }, 'non-finite-input'],
    [{ kind: 'normal', mean: 1, sd: -1 }, 'negative-uncertainty'],
    [{ kind: 'rectangular', middle: 1, halfWidth: Number.POSITIVE_INFINITY }, 'non-finite-input'],
    [{ kind: 'lognormal', mean: 0, sd: 1 }, 'non-positive-dimension'],
    [{ kind: 'readings', values: [1] }, 'too-few-points'],
    [{ kind: 'readings', values: [1, Number.NaN] }, 'non-finite-input'],
  ])('are refused for %o', (spread, code) => {
    expect(() => drawFrom(spread)).toThrow(expect.objectContaining({ code }));
  });
});

describe('a coverage interval', () => {
  it('of a sum of four equal rectangles is ±3.879 u, narrower than the normal ±3.920', () => {
    const one: Spread = { kind: 'rectangular', middle: 0, halfWidth: Math.sqrt(3) };
    const sum = (values: Float64Array) => values.reduce((total, value) => total + value, 0);
    const drawing = { spreads: [one, one, one, one], models: [sum], draws: 200_000, coverage: 0.95, seed: 5 };
    const [summary] = propagateDraws(drawing).summaries;
    // the ends are known to √(p(1−p)/N)/f: about 0.012
    expect(Math.abs((summary?.symmetric.high ?? 0) - 3.8794)).toBeLessThan(0.05);
    expect(Math.abs((summary?.symmetric.low ?? 0) + 3.8794)).toBeLessThan(0.05);
  });

  it('that is shortest leans towards the steep side of a skewed spread', () => {
    const { symmetric, shortest } = drawnAlone({ kind: 'lognormal', mean: 1, sd: 0.6 });
    expect(shortest.high - shortest.low).toBeLessThan(symmetric.high - symmetric.low);
    expect(shortest.low).toBeLessThan(symmetric.low);
  });
});

describe('methods drawn together', () => {
  const quantities: Record<string, Spread> = {
    A: { kind: 'exact', value: 2 },
    KIc: { kind: 'exact', value: 0.8 },
    Y: { kind: 'exact', value: 1.28 },
    radiusPx: { kind: 'exact', value: 450 },
    depthPx: { kind: 'exact', value: 45 },
    pixelSize: { kind: 'normal', mean: 0.001, sd: 0.00003 },
  };
  const mirror = { method: mirrorStress, output: 'stress', drawn: { A: ['A'], R: ['radiusPx', 'pixelSize'] } };
  const flaw = {
    method: flawStress,
    output: 'stress',
    drawn: { KIc: ['KIc'], Y: ['Y'], c: ['depthPx', 'pixelSize'] },
  };
  const drawing = { quantities, methods: [mirror, flaw], draws: 20_000, coverage: 0.95, seed: 9 };

  it('share what they share: one scale moves both, and not their ratio', () => {
    const { summaries, differences } = drawMethods(drawing);
    const [first, second] = summaries;
    // 3 % of the scale is 1.5 % of a stress
    expect((first?.sd ?? 0) / (first?.mean ?? 1)).toBeCloseTo(0.015, 3);
    const apart = differences[0]?.summary;
    expect(apart?.mean).toBeCloseTo((first?.mean ?? 0) - (second?.mean ?? 0), 6);
    expect(apart?.sd).toBeCloseTo(Math.abs((first?.sd ?? 0) - (second?.sd ?? 0)), 6);
  });

  it('give the same digits for the same seed', () => {
    expect(drawMethods(drawing)).toEqual(drawMethods(drawing));
    expect(drawMethods({ ...drawing, seed: 10 })).not.toEqual(drawMethods(drawing));
  });

  it('tell how far they are', () => {
    const spreads: Spread[] = [{ kind: 'normal', mean: 0, sd: 1 }];
    const blocks = drawInBlocks({ spreads, models: [itself], draws: 25_000, coverage: 0.9, seed: 1 });
    expect([blocks.next().value, blocks.next().value, blocks.next().value]).toEqual([
      { done: 10_000, of: 25_000 },
      { done: 20_000, of: 25_000 },
      { done: 25_000, of: 25_000 },
    ]);
    expect(blocks.next().done).toBe(true);
  });

  it('are refused where the spread often reaches what the formula refuses', () => {
    const wide = { ...quantities, pixelSize: { kind: 'normal', mean: 0.001, sd: 0.001 } } as const;
    const wrong = () => drawMethods({ ...drawing, quantities: wide });
    expect(wrong).toThrow(expect.objectContaining({ code: 'outside-validity-range' }));
  });

  it.each([
    [{ draws: 1 }, 'too-few-points'],
    [{ draws: 2.5 }, 'too-few-points'],
    [{ coverage: 1 }, 'outside-validity-range'],
    [{ quantities: {} }, 'unknown-input'],
  ])('are refused for %o', (wrong, code) => {
    expect(() => drawMethods({ ...drawing, ...wrong })).toThrow(expect.objectContaining({ code }));
  });
});
