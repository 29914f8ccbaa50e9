import { describe, expect, it } from 'vitest';
import { breakLocation } from './break-location.ts';
import { standardSpecimen } from './standard-specimen.ts';
import { storedEnergy } from './stored-energy.ts';

const spans = { outerSpanMm: 40, innerSpanMm: 20 };

describe('the size of a bar', () => {
  const bar = { widthMm: 4, depthMm: 3, ...spans };

  it('is B in both standards for 3 × 4 on 40 and 20 mm, within the tolerance of the section', () => {
    const sizeB = { c1161Size: 'B', iso14704Span30: false, en843Size: 'B' };
    expect(standardSpecimen(bar)).toEqual(sizeB);
    expect(standardSpecimen({ ...bar, depthMm: 3.13 })).toEqual(sizeB);
    expect(standardSpecimen({ ...bar, depthMm: 3.14 })).toMatchObject({ c1161Size: 'none' });
  });

  it('is A or C at three points too', () => {
    const threePoint = { widthMm: 2, depthMm: 1.5, outerSpanMm: 20, innerSpanMm: 0 };
    expect(standardSpecimen(threePoint).c1161Size).toBe('A');
    expect(standardSpecimen({ widthMm: 8, depthMm: 6, outerSpanMm: 80, innerSpanMm: 0 }).c1161Size).toBe('C');
  });

  it('is none when it lies on its side', () => {
    expect(standardSpecimen({ ...bar, widthMm: 3, depthMm: 4 }).c1161Size).toBe('none');
  });

  it.each([
    [{ widthMm: 0 }, 'non-positive-dimension', 'widthMm'],
    [{ innerSpanMm: Number.NaN }, 'non-finite-input', 'innerSpanMm'],
    [{ innerSpanMm: 41 }, 'inner-span-not-less-than-outer', 'innerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => standardSpecimen({ ...bar, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the place of a break', () => {
  it('is inside up to the inner roller, and between the rollers beyond it', () => {
    expect(breakLocation({ ...spans, xMm: -10 })).toEqual({ location: 'inside-inner-span', momentRatio: 1 });
    expect(breakLocation({ ...spans, xMm: 15 })).toEqual({ location: 'between-rollers', momentRatio: 0.5 });
  });

  it.each([
    [{ xMm: 20 }, 'position-outside-span', 'xMm'],
    [{ xMm: -25 }, 'position-outside-span', 'xMm'],
    [{ xMm: Number.NaN }, 'non-finite-input', 'xMm'],
    [{ outerSpanMm: 0, xMm: 30 }, 'non-positive-span', 'outerSpanMm'],
    [{ innerSpanMm: -1 }, 'negative-inner-span', 'innerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => breakLocation({ ...spans, xMm: 0, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the energy stored in a bar', () => {
  const bar = {
    ...spans,
    stressMPa: 600,
    modulusGPa: 310,
    widthMm: 4,
    depthMm: 3,
    toughnessMPaRootM: 4.5,
    poissonRatio: 0.27,
  };

  it('is σ²bd/6E × [l + (L − l)/3]: 360 000 × 12 / 1 860 000 × 26.67', () => {
    expect(storedEnergy(bar).energyMJ).toBeCloseTo((4_320_000 / 1_860_000) * (80 / 3), 9);
  });

  it('grows fourfold with twice the stress, and so do the cracks it could pay for', () => {
    const twice = storedEnergy({ ...bar, stressMPa: 1200 });
    expect(twice.energyMJ).toBeCloseTo(4 * storedEnergy(bar).energyMJ, 9);
    expect(twice.crackCount).toBeCloseTo(4 * storedEnergy(bar).crackCount, 9);
    expect(twice.energyReleaseJPerM2).toBe(storedEnergy(bar).energyReleaseJPerM2);
  });

  it.each([
    [{ stressMPa: 0 }, 'non-positive-stress', 'stressMPa'],
    [{ stressMPa: Number.NaN }, 'non-finite-input', 'stressMPa'],
    [{ modulusGPa: 0 }, 'outside-validity-range', 'modulusGPa'],
    [{ toughnessMPaRootM: 0 }, 'non-positive-toughness', 'toughnessMPaRootM'],
    [{ poissonRatio: 0.5 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ depthMm: 0, stressMPa: 0 }, 'non-positive-dimension', 'depthMm'],
    [{ innerSpanMm: 40 }, 'inner-span-not-less-than-outer', 'innerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => storedEnergy({ ...bar, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
