import { describe, expect, it } from 'vitest';
import { constantRateStrength } from './constant-rate-strength.ts';
import { rateCorrectedStressMPa } from './rate-corrected-stress.ts';
import { slowTestToughness } from './slow-test-toughness.ts';
import { staticLifeS } from './static-life.ts';

const change = { stressMPa: 85, rateMPaPerS: 1, targetRateMPaPerS: 100, exponent: 16 };
const rate = { inertStrengthMPa: 100, growthConstantMPa2S: 5, exponent: 16, rateMPaPerS: 10 };
const hold = { inertStrengthMPa: 100, growthConstantMPa2S: 0.5, exponent: 16, stressMPa: 50 };

describe('the fracture stress at another rate', () => {
  it('is 85 × 100^(1/17) = 111.45', () => {
    expect(rateCorrectedStressMPa(change)).toBeCloseTo(85 * 100 ** (1 / 17), 9);
  });

  it('goes back to itself', () => {
    const there = rateCorrectedStressMPa(change);
    const back = { stressMPa: there, rateMPaPerS: 100, targetRateMPaPerS: 1, exponent: 16 };
    expect(rateCorrectedStressMPa(back)).toBeCloseTo(85, 10);
  });

  it('hardly changes where growth is slow to start', () => {
    expect(rateCorrectedStressMPa({ ...change, exponent: 1e6 })).toBeCloseTo(85, 3);
  });

  it.each([
    [{ exponent: Number.NaN }, 'non-finite-input', 'exponent'],
    [{ stressMPa: 0 }, 'non-positive-stress', 'stressMPa'],
    [{ rateMPaPerS: 0 }, 'non-positive-rate', 'rateMPaPerS'],
    [{ targetRateMPaPerS: -1 }, 'non-positive-rate', 'targetRateMPaPerS'],
    [{ exponent: 2 }, 'outside-validity-range', 'exponent'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => rateCorrectedStressMPa({ ...change, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the fracture stress at a constant rate', () => {
  it('satisfies its own relation', () => {
    const { stressMPa } = constantRateStrength(rate);
    const right = 5 * 17 * 10 * (100 ** 14 - stressMPa ** 14);
    expect(stressMPa ** 17 / right).toBeCloseTo(1, 9);
  });

  it('follows the rate correction where it is slow', () => {
    const slow = constantRateStrength({ ...rate, rateMPaPerS: 1e-6 }).stressMPa;
    const slower = constantRateStrength({ ...rate, rateMPaPerS: 1e-8 }).stressMPa;
    const corrected = { stressMPa: slow, rateMPaPerS: 1e-6, targetRateMPaPerS: 1e-8, exponent: 16 };
    expect(slower / rateCorrectedStressMPa(corrected)).toBeCloseTo(1, 4);
  });

  it('rises with the rate up to the inert strength and never beyond', () => {
    const stresses = [1e-3, 1, 1e3, 1e6, 1e12].map(
      (rateMPaPerS) => constantRateStrength({ ...rate, rateMPaPerS }).stressMPa,
    );
    expect(stresses).toEqual([...stresses].sort((one, other) => one - other));
    expect(stresses.at(-1)).toBeLessThanOrEqual(100);
    expect(stresses.at(-1)).toBeCloseTo(100, 3);
  });

  it('holds at exponents whose powers leave the range of numbers', () => {
    const { stressMPa } = constantRateStrength({ ...rate, inertStrengthMPa: 1000, exponent: 300 });
    expect(stressMPa).toBeGreaterThan(900);
    expect(stressMPa).toBeLessThan(1000);
  });

  it('grows the flaw as the square of the fall in strength', () => {
    const { stressMPa, apparentToughnessRatio, flawGrowthRatio } = constantRateStrength(rate);
    const read = slowTestToughness({ toughnessMPaRootM: 0.75, stressMPa, inertStrengthMPa: 100 });
    expect(read.apparentToughnessMPaRootM / 0.75).toBeCloseTo(apparentToughnessRatio, 12);
    expect(read.flawGrowthRatio).toBeCloseTo(flawGrowthRatio, 10);
  });

  it.each([
    [{ rateMPaPerS: Number.NaN }, 'non-finite-input', 'rateMPaPerS'],
    [{ inertStrengthMPa: 0 }, 'non-positive-stress', 'inertStrengthMPa'],
    [{ growthConstantMPa2S: 0 }, 'outside-validity-range', 'growthConstantMPa2S'],
    [{ exponent: 1.9 }, 'outside-validity-range', 'exponent'],
    [{ rateMPaPerS: 0 }, 'non-positive-rate', 'rateMPaPerS'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => constantRateStrength({ ...rate, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the time to fracture under a constant stress', () => {
  it('is 0.5 × 100¹⁴ / 50¹⁶ = 0.5 × 2¹⁴ / 2500 = 3.2768 s', () => {
    expect(staticLifeS(hold)).toBeCloseTo((0.5 * 2 ** 14) / 2500, 10);
  });

  it('is 1/(n + 1) of the time of a test at a constant rate to the same stress', () => {
    const slow = { inertStrengthMPa: 100, growthConstantMPa2S: 0.5, exponent: 16, rateMPaPerS: 1e-6 };
    const { stressMPa } = constantRateStrength(slow);
    const testS = stressMPa / 1e-6;
    expect((staticLifeS({ ...hold, stressMPa }) * 17) / testS).toBeCloseTo(1, 3);
  });

  it.each([
    [{ stressMPa: Number.POSITIVE_INFINITY }, 'non-finite-input', 'stressMPa'],
    [{ stressMPa: 0 }, 'non-positive-stress', 'stressMPa'],
    [{ growthConstantMPa2S: -1 }, 'outside-validity-range', 'growthConstantMPa2S'],
    [{ exponent: 2 }, 'outside-validity-range', 'exponent'],
    [{ stressMPa: 100 }, 'outside-validity-range', 'stressMPa'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => staticLifeS({ ...hold, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the apparent toughness in a slow test', () => {
  const test = { toughnessMPaRootM: 0.75, stressMPa: 60, inertStrengthMPa: 90 };

  it('is 0.75 × 60/90 = 0.5, with a flaw grown 2.25 times', () => {
    expect(slowTestToughness(test).apparentToughnessMPaRootM).toBeCloseTo(0.5, 12);
    expect(slowTestToughness(test).flawGrowthRatio).toBeCloseTo(2.25, 12);
  });

  it('is the toughness itself at the inert strength', () => {
    const inert = { apparentToughnessMPaRootM: 0.75, flawGrowthRatio: 1 };
    expect(slowTestToughness({ ...test, stressMPa: 90 })).toEqual(inert);
  });

  it.each([
    [{ toughnessMPaRootM: Number.NaN }, 'non-finite-input', 'toughnessMPaRootM'],
    [{ inertStrengthMPa: 0 }, 'non-positive-stress', 'inertStrengthMPa'],
    [{ toughnessMPaRootM: 0 }, 'non-positive-toughness', 'toughnessMPaRootM'],
    [{ stressMPa: 91 }, 'outside-validity-range', 'stressMPa'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => slowTestToughness({ ...test, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
