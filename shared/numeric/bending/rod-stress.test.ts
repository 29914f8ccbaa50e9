import { describe, expect, it } from 'vitest';
import { cantileverRodStressMPa } from './cantilever-rod-stress.ts';
import { fourPointRodAngleStress } from './four-point-rod-angle-stress.ts';
import { fourPointRodLocalStress } from './four-point-rod-local-stress.ts';
import { fourPointRodStressMPa } from './four-point-rod-stress.ts';
import { threePointRodLocalStress } from './three-point-rod-local-stress.ts';
import { threePointRodStressMPa } from './three-point-rod-stress.ts';

const rod = { loadN: 690, outerSpanMm: 40, innerSpanMm: 20, diameterMm: 4 };
const inRod = { ...rod, xMm: -11.5, yMm: 0.25 };

describe('the nominal stress in a bent rod', () => {
  it('is 8FL/πD³ at three points: 8 × 420 × 40 / (π × 42.875)', () => {
    const stress = threePointRodStressMPa({ loadN: 420, outerSpanMm: 40, diameterMm: 3.5 });
    expect(stress).toBeCloseTo(134_400 / (Math.PI * 42.875), 9);
  });

  it('is 4FL/πD³ at quarter points and 16FL/3πD³ at third points', () => {
    expect(fourPointRodStressMPa(rod)).toBeCloseTo((4 * 690 * 40) / (Math.PI * 64), 9);
    const thirds = { loadN: 250, outerSpanMm: 45, innerSpanMm: 15, diameterMm: 2.5 };
    expect(fourPointRodStressMPa(thirds)).toBeCloseTo((16 * 250 * 45) / (3 * Math.PI * 2.5 ** 3), 9);
  });

  it('is the three-point stress when the inner rollers meet', () => {
    expect(fourPointRodStressMPa({ ...rod, innerSpanMm: 0 })).toBeCloseTo(threePointRodStressMPa(rod), 9);
  });

  it('stays the same when all lengths double and the load grows fourfold', () => {
    const larger = { loadN: 2760, outerSpanMm: 80, innerSpanMm: 40, diameterMm: 8 };
    expect(fourPointRodStressMPa(larger)).toBeCloseTo(fourPointRodStressMPa(rod), 9);
  });

  it.each([
    [{ diameterMm: Number.NaN }, 'non-finite-input', 'diameterMm'],
    [{ loadN: Number.POSITIVE_INFINITY }, 'non-finite-input', 'loadN'],
    [{ diameterMm: 0, outerSpanMm: 0 }, 'non-positive-dimension', 'diameterMm'],
    [{ outerSpanMm: 0, loadN: -1 }, 'non-positive-span', 'outerSpanMm'],
    [{ loadN: -1 }, 'negative-load', 'loadN'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => threePointRodStressMPa({ ...rod, ...wrong })).toThrow(refusal);
    expect(() => fourPointRodStressMPa({ ...rod, ...wrong })).toThrow(refusal);
  });

  it.each([
    [{ innerSpanMm: -1 }, 'negative-inner-span', 'innerSpanMm'],
    [{ innerSpanMm: 40 }, 'inner-span-not-less-than-outer', 'innerSpanMm'],
  ])('at four points is refused for %o', (wrong, code, field) => {
    expect(() => fourPointRodStressMPa({ ...rod, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the stress at an origin in a bent rod', () => {
  it('is the nominal stress times both ratios: (40 − 23)/20 × (1 − 0.5/4)', () => {
    const { nominalStressMPa, localStressMPa } = fourPointRodLocalStress(inRod);
    expect(localStressMPa).toBeCloseTo(nominalStressMPa * 0.85 * 0.875, 9);
  });

  it('falls in a line from mid-span at three points, alike on either side', () => {
    const { nominalStressMPa, localStressMPa } = threePointRodLocalStress({ ...inRod, xMm: 8, yMm: 0 });
    expect(localStressMPa).toBeCloseTo(0.6 * nominalStressMPa, 9);
    expect(threePointRodLocalStress({ ...inRod, xMm: -8, yMm: 0 }).localStressMPa).toBe(localStressMPa);
  });

  it('is nothing on the axis, and compression above it', () => {
    expect(fourPointRodLocalStress({ ...inRod, yMm: 2 }).localStressMPa).toBeCloseTo(0, 12);
    expect(threePointRodLocalStress({ ...inRod, yMm: 4 }).localStressMPa).toBeLessThan(0);
  });

  it('is the same whether the place on the surface is given by its angle or by its height', () => {
    const { yMm, localStressMPa } = fourPointRodAngleStress({ ...rod, xMm: 3, angleDeg: -60 });
    expect(yMm).toBeCloseTo(1, 12);
    expect(fourPointRodLocalStress({ ...rod, xMm: 3, yMm }).localStressMPa).toBeCloseTo(localStressMPa, 9);
    const { nominalStressMPa } = fourPointRodAngleStress({ ...rod, xMm: 3, angleDeg: 180 });
    expect(fourPointRodAngleStress({ ...rod, xMm: 3, angleDeg: 180 }).localStressMPa).toBeCloseTo(-nominalStressMPa, 9);
  });

  it.each([
    [{ xMm: Number.NaN }, 'non-finite-input', 'xMm'],
    [{ yMm: -0.01 }, 'depth-outside-section', 'yMm'],
    [{ yMm: 4.01, xMm: 30 }, 'depth-outside-section', 'yMm'],
    [{ xMm: -20.01 }, 'position-outside-span', 'xMm'],
    [{ loadN: -1, yMm: 9 }, 'negative-load', 'loadN'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => threePointRodLocalStress({ ...inRod, ...wrong })).toThrow(refusal);
    expect(() => fourPointRodLocalStress({ ...inRod, ...wrong })).toThrow(refusal);
  });

  it.each([
    [{ angleDeg: Number.NaN }, 'non-finite-input', 'angleDeg'],
    [{ angleDeg: 181 }, 'outside-validity-range', 'angleDeg'],
    [{ angleDeg: 181, diameterMm: -4 }, 'non-positive-dimension', 'diameterMm'],
    [{ xMm: 21 }, 'position-outside-span', 'xMm'],
  ])('round the surface is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => fourPointRodAngleStress({ ...rod, xMm: 0, angleDeg: 25, ...wrong })).toThrow(refusal);
  });
});

describe('the stress at the fixed end of a rod', () => {
  const fixed = { loadN: 25, armMm: 60, diameterMm: 6 };

  it('is 32Fh/πD³: 32 × 25 × 60 / (π × 216)', () => {
    expect(cantileverRodStressMPa(fixed)).toBeCloseTo(48_000 / (Math.PI * 216), 9);
  });

  it('is that of a three-point rod of twice the arm under twice the load', () => {
    const supported = { loadN: 50, outerSpanMm: 120, diameterMm: 6 };
    expect(cantileverRodStressMPa(fixed)).toBeCloseTo(threePointRodStressMPa(supported), 9);
  });

  it.each([
    [{ armMm: Number.NaN }, 'non-finite-input', 'armMm'],
    [{ armMm: 0 }, 'non-positive-dimension', 'armMm'],
    [{ diameterMm: 0, loadN: -1 }, 'non-positive-dimension', 'diameterMm'],
    [{ loadN: -1 }, 'negative-load', 'loadN'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => cantileverRodStressMPa({ ...fixed, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
