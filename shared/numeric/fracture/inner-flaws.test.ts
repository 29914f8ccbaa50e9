import { describe, expect, it } from 'vitest';
import { embeddedToughnessSensitivities } from '../uncertainty/embedded-toughness-sensitivities.ts';
import { embeddedApparentToughness } from './embedded-apparent-toughness.ts';
import { pennyInGradient } from './penny-in-gradient.ts';
import { poreBracket } from './pore-bracket.ts';

const bar = {
  loadN: 500,
  outerSpanMm: 40,
  innerSpanMm: 20,
  widthMm: 4,
  depthMm: 3,
  xMm: 0,
  yMm: 0.3,
  flawRadiusMm: 0.1,
};
const penny = { stressAtCentreMPa: 300, gradientMPaPerMm: 600, radiusMm: 0.1 };
const pore = { poreRadiusMm: 0.04, crackLengthMm: 0.008, poissonRatio: 0.25 };

describe('the apparent toughness of a round flaw in a bar', () => {
  it('is 2/√π × 416.67 × 0.8 × √(1e-4) = 3.761', () => {
    const { localStressMPa, apparentToughnessMPaRootM } = embeddedApparentToughness(bar);
    expect(localStressMPa).toBeCloseTo((30_000 / 72) * 0.8, 9);
    expect(apparentToughnessMPaRootM).toBeCloseTo((2 / Math.sqrt(Math.PI)) * (30_000 / 72) * 0.8 * 0.01, 9);
  });

  it('changes with each input as small steps say', () => {
    const at = { ...bar, xMm: 13 };
    const slopes = embeddedToughnessSensitivities(at);
    const numeric = (name: keyof typeof bar) => {
      const of = (value: number) => embeddedApparentToughness({ ...at, [name]: value }).apparentToughnessMPaRootM;
      return (of(at[name] + 1e-5) - of(at[name] - 1e-5)) / 2e-5;
    };
    expect(slopes.load).toBeCloseTo(numeric('loadN'), 6);
    expect(slopes.outerSpan).toBeCloseTo(numeric('outerSpanMm'), 6);
    expect(slopes.innerSpan).toBeCloseTo(numeric('innerSpanMm'), 6);
    expect(slopes.width).toBeCloseTo(numeric('widthMm'), 6);
    expect(slopes.depth).toBeCloseTo(numeric('depthMm'), 6);
    expect(slopes.x).toBeCloseTo(numeric('xMm'), 6);
    expect(slopes.y).toBeCloseTo(numeric('yMm'), 6);
    expect(slopes.a).toBeCloseTo(numeric('flawRadiusMm'), 5);
  });

  it.each([
    [{ flawRadiusMm: Number.NaN }, 'non-finite-input', 'flawRadiusMm'],
    [{ flawRadiusMm: 0 }, 'non-positive-flaw-size', 'flawRadiusMm'],
    [{ flawRadiusMm: 0.31 }, 'outside-validity-range', 'yMm'],
    [{ yMm: 1.6 }, 'non-positive-stress', 'yMm'],
    [{ depthMm: 0 }, 'non-positive-dimension', 'depthMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => embeddedApparentToughness({ ...bar, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the stress intensity of a round flaw in a gradient', () => {
  it('is 2/√π × 0.01 × (300 ± ⅔ × 0.1 × 600) = 3.837 and 2.934', () => {
    const { largestMPaRootM, smallestMPaRootM } = pennyInGradient(penny);
    expect(largestMPaRootM).toBeCloseTo((2 / Math.sqrt(Math.PI)) * 0.01 * 340, 12);
    expect(smallestMPaRootM).toBeCloseTo((2 / Math.sqrt(Math.PI)) * 0.01 * 260, 12);
  });

  it('is the same whichever way the stress rises, and even without a gradient', () => {
    expect(pennyInGradient({ ...penny, gradientMPaPerMm: -600 })).toEqual(pennyInGradient(penny));
    const even = pennyInGradient({ ...penny, gradientMPaPerMm: 0 });
    expect(even.largestMPaRootM).toBe(even.smallestMPaRootM);
  });

  it.each([
    [{ gradientMPaPerMm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'gradientMPaPerMm'],
    [{ radiusMm: 0 }, 'non-positive-flaw-size', 'radiusMm'],
    [{ stressAtCentreMPa: 0 }, 'non-positive-stress', 'stressAtCentreMPa'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => pennyInGradient({ ...penny, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('a pore with a crack round it', () => {
  it('raises the stress at its wall by (27 − 3)/(2 × 6) = 2 at ν = 0.2', () => {
    expect(poreBracket({ ...pore, poissonRatio: 0.2 }).concentration).toBeCloseTo(2, 12);
  });

  it('goes over from a short crack to a penny near a crack of 0.085 of the radius', () => {
    const below = poreBracket({ ...pore, crackLengthMm: 0.04 * 0.08 });
    const above = poreBracket({ ...pore, crackLengthMm: 0.04 * 0.09 });
    expect(below.smallerRootM).toBe(below.shortCrackRootM);
    expect(above.smallerRootM).toBe(above.pennyRootM);
  });

  it.each([
    [{ poreRadiusMm: Number.NaN }, 'non-finite-input', 'poreRadiusMm'],
    [{ poreRadiusMm: 0 }, 'non-positive-flaw-size', 'poreRadiusMm'],
    [{ crackLengthMm: 0 }, 'non-positive-flaw-size', 'crackLengthMm'],
    [{ poissonRatio: 0.5 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ poissonRatio: -0.1 }, 'poisson-out-of-range', 'poissonRatio'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => poreBracket({ ...pore, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
