import { describe, expect, it } from 'vitest';
import { pistonOnThreeBallsLocalStress } from './piston-on-three-balls-local-stress.ts';
import { pistonOnThreeBallsStress } from './piston-on-three-balls-stress.ts';
import { ringOnRingLocalStress } from './ring-on-ring-local-stress.ts';
import { ringOnRingStressMPa } from './ring-on-ring-stress.ts';

const rings = {
  loadN: 1000,
  thicknessMm: 2,
  poissonRatio: 0.22,
  supportDiameterMm: 30,
  loadDiameterMm: 10,
  discDiameterMm: 36,
};
const balls = {
  loadN: 500,
  thicknessMm: 1.2,
  poissonRatio: 0.25,
  supportRadiusMm: 5,
  pistonRadiusMm: 0.7,
  discRadiusMm: 7,
};

describe('the stress in a disc between two rings', () => {
  it('is 3F/2πh² × [0.78 × (900 − 100)/(2 × 1296) + 1.22 ln 3] within the load ring', () => {
    const bracket = (0.78 * 800) / 2592 + 1.22 * Math.log(3);
    expect(ringOnRingStressMPa(rings)).toBeCloseTo((3000 / (8 * Math.PI)) * bracket, 9);
  });

  it('falls fourfold with a doubled thickness, and with a wider overhang', () => {
    expect(ringOnRingStressMPa({ ...rings, thicknessMm: 4 })).toBeCloseTo(ringOnRingStressMPa(rings) / 4, 9);
    expect(ringOnRingStressMPa({ ...rings, discDiameterMm: 40 })).toBeLessThan(ringOnRingStressMPa(rings));
  });

  it('is level within the load ring and goes on from it without a step', () => {
    const atRing = ringOnRingLocalStress({ ...rings, radiusMm: 5 });
    expect(atRing).toEqual(ringOnRingLocalStress({ ...rings, radiusMm: 0 }));
    const beside = ringOnRingLocalStress({ ...rings, radiusMm: 5 + 1e-9 });
    expect(beside.radialStressMPa).toBeCloseTo(atRing.radialStressMPa, 5);
  });

  it('has no radial part at the support when the disc ends there', () => {
    const ending = { ...rings, discDiameterMm: 30, radiusMm: 15 };
    expect(ringOnRingLocalStress(ending).radialStressMPa).toBeCloseTo(0, 9);
  });

  it.each([
    [{ poissonRatio: Number.NaN }, 'non-finite-input', 'poissonRatio'],
    [{ radiusMm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'radiusMm'],
    [{ thicknessMm: 0 }, 'non-positive-dimension', 'thicknessMm'],
    [{ poissonRatio: 0.5 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ poissonRatio: -0.01 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ loadDiameterMm: 30 }, 'diameters-out-of-order', 'loadDiameterMm'],
    [{ discDiameterMm: 29 }, 'diameters-out-of-order', 'supportDiameterMm'],
    [{ loadN: -1 }, 'negative-load', 'loadN'],
    [{ radiusMm: 15.01 }, 'outside-validity-range', 'radiusMm'],
    [{ radiusMm: -1 }, 'outside-validity-range', 'radiusMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const disc = { ...rings, radiusMm: 3, ...wrong };
    expect(() => ringOnRingLocalStress(disc)).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the stress in a disc on three balls', () => {
  it('is 0.2387 F (Y − X)/h², X = 1.25 ln 0.01 + 0.00375, Y = 1.25 (1 + ln 25/49) + 0.75 × 25/49', () => {
    const x = 1.25 * Math.log(0.01) + 0.00375;
    const y = 1.25 * (1 + Math.log(25 / 49)) + (0.75 * 25) / 49;
    const stress = pistonOnThreeBallsStress(balls);
    expect(stress.x).toBeCloseTo(x, 12);
    expect(stress.y).toBeCloseTo(y, 12);
    expect(stress.stressMPa).toBeCloseTo((0.2387 * 500 * (y - x)) / 1.44, 9);
  });

  it('is higher under a narrower piston and the same when everything is twice as large under fourfold load', () => {
    const { stressMPa } = pistonOnThreeBallsStress(balls);
    expect(pistonOnThreeBallsStress({ ...balls, pistonRadiusMm: 0.5 }).stressMPa).toBeGreaterThan(stressMPa);
    const twice = { supportRadiusMm: 10, pistonRadiusMm: 1.4, discRadiusMm: 14, thicknessMm: 2.4, loadN: 2000 };
    expect(pistonOnThreeBallsStress({ ...balls, ...twice }).stressMPa).toBeCloseTo(stressMPa, 9);
  });

  it('is the same in all directions at the centre, and falls faster along the radius than across it', () => {
    const { stressMPa } = pistonOnThreeBallsStress(balls);
    const centre = pistonOnThreeBallsLocalStress({ ...balls, radiusMm: 0 });
    expect(centre).toEqual({ radialStressMPa: stressMPa, tangentialStressMPa: stressMPa });
    const away = pistonOnThreeBallsLocalStress({ ...balls, radiusMm: 0.7 });
    expect(away.radialStressMPa).toBeLessThan(away.tangentialStressMPa);
    expect(away.tangentialStressMPa).toBeLessThan(stressMPa);
  });

  it.each([
    [{ thicknessMm: Number.NaN }, 'non-finite-input', 'thicknessMm'],
    [{ pistonRadiusMm: 0 }, 'non-positive-dimension', 'pistonRadiusMm'],
    [{ poissonRatio: 0.55 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ pistonRadiusMm: 5 }, 'diameters-out-of-order', 'pistonRadiusMm'],
    [{ supportRadiusMm: 7.1 }, 'diameters-out-of-order', 'supportRadiusMm'],
    [{ loadN: -1 }, 'negative-load', 'loadN'],
    [{ radiusMm: 0.71 }, 'outside-validity-range', 'radiusMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const disc = { ...balls, radiusMm: 0.3, ...wrong };
    expect(() => pistonOnThreeBallsLocalStress(disc)).toThrow(expect.objectContaining({ code, field }));
  });
});
