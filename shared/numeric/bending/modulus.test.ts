import { describe, expect, it } from 'vitest';
import { gaugeAgainstBeam } from './gauge-against-beam.ts';
import { gaugeModulus } from './gauge-modulus.ts';
import { meanMomentRatio } from './mean-moment-ratio.ts';
import { fourPointModulus } from './four-point-modulus.ts';
import { threePointModulus } from './three-point-modulus.ts';
import { shearDeflectionFactor } from './shear-deflection-factor.ts';

const bar = { slopeNPerMm: 2100, machineMmPerN: 0, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3 };

describe('the modulus from a slope', () => {
  it('is kL³/4bd³ at three points: 2100 × 64 000 / 432 MPa', () => {
    expect(threePointModulus(bar).modulusGPa).toBeCloseTo((2.1 * 64_000) / 432, 9);
  });

  it('is the three-point one when the inner rollers meet, wherever the deflection is read', () => {
    const meeting = { ...bar, innerSpanMm: 0 };
    const { modulusGPa } = threePointModulus(bar);
    expect(fourPointModulus(meeting, 'mid-span').modulusGPa).toBeCloseTo(modulusGPa, 9);
    expect(fourPointModulus(meeting, 'inner rollers').modulusGPa).toBeCloseTo(modulusGPa, 9);
  });

  it('is higher once the machine is taken off: 1/(1/2000 − 1/10 000) = 2500', () => {
    const onMachine = { ...bar, slopeNPerMm: 2000, machineMmPerN: 1e-4 };
    expect(threePointModulus(onMachine).specimenSlopeNPerMm).toBeCloseTo(2500, 9);
    const direct = threePointModulus({ ...bar, slopeNPerMm: 2500 }).modulusGPa;
    expect(threePointModulus(onMachine).modulusGPa).toBeCloseTo(direct, 9);
  });

  it.each([
    [{ slopeNPerMm: Number.NaN }, 'non-finite-input', 'slopeNPerMm'],
    [{ widthMm: 0, slopeNPerMm: 0 }, 'non-positive-dimension', 'widthMm'],
    [{ outerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
    [{ slopeNPerMm: 0 }, 'outside-validity-range', 'slopeNPerMm'],
    [{ machineMmPerN: -1e-6 }, 'outside-validity-range', 'machineMmPerN'],
    [{ machineMmPerN: 1 / 2000 }, 'outside-validity-range', 'machineMmPerN'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => threePointModulus({ ...bar, ...wrong })).toThrow(refusal);
    expect(() => fourPointModulus({ ...bar, ...wrong }, 'mid-span')).toThrow(refusal);
  });
});

describe('the part of shear in the deflection', () => {
  const slender = { depthMm: 3, outerSpanMm: 40, poissonRatio: 0.23 };

  it('is 2.4 × 1.23 × 9/1600, and four times as much on half the span', () => {
    expect(shearDeflectionFactor(slender) - 1).toBeCloseTo((2.4 * 1.23 * 9) / 1600, 12);
    expect(shearDeflectionFactor({ ...slender, outerSpanMm: 20 }) - 1).toBeCloseTo((4 * 2.4 * 1.23 * 9) / 1600, 12);
  });

  it.each([
    [{ depthMm: 0 }, 'non-positive-dimension', 'depthMm'],
    [{ poissonRatio: 0.5 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ outerSpanMm: Number.NaN }, 'non-finite-input', 'outerSpanMm'],
    [{ outerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => shearDeflectionFactor({ ...slender, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('a strain gauge on a four-point bar', () => {
  const gauged = { loadN: 300, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3, gaugeStrain: 0.0008 };

  it('gives the modulus 250/0.0008 MPa, with which it agrees with the load', () => {
    const { modulusGPa } = gaugeModulus(gauged);
    expect(modulusGPa).toBeCloseTo(312.5, 9);
    expect(gaugeAgainstBeam({ ...gauged, modulusGPa }).ratio).toBeCloseTo(1, 12);
  });

  it.each([
    [{ gaugeStrain: Number.NaN }, 'non-finite-input', 'gaugeStrain'],
    [{ gaugeStrain: 0 }, 'outside-validity-range', 'gaugeStrain'],
    [{ innerSpanMm: 40 }, 'inner-span-not-less-than-outer', 'innerSpanMm'],
    [{ modulusGPa: 0 }, 'outside-validity-range', 'modulusGPa'],
    [{ loadN: 0 }, 'outside-validity-range', 'loadN'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => gaugeAgainstBeam({ ...gauged, modulusGPa: 310, ...wrong })).toThrow(refusal);
  });
});

describe('the mean moment along a gauge', () => {
  const gauge = { outerSpanMm: 40, gaugeLengthMm: 2, offsetMm: 0 };

  it('is 1 − g/2L centred at mid-span, and that at its middle beside it', () => {
    expect(meanMomentRatio(gauge)).toBeCloseTo(1 - 2 / 80, 12);
    expect(meanMomentRatio({ ...gauge, offsetMm: -3 })).toBeCloseTo(0.85, 12);
  });

  it('goes over smoothly where the gauge leaves mid-span, alike on either side', () => {
    expect(meanMomentRatio({ ...gauge, offsetMm: 1 - 1e-9 })).toBeCloseTo(
      meanMomentRatio({ ...gauge, offsetMm: 1 }),
      9,
    );
    expect(meanMomentRatio({ ...gauge, offsetMm: 0.4 })).toBe(meanMomentRatio({ ...gauge, offsetMm: -0.4 }));
  });

  it.each([
    [{ gaugeLengthMm: 0 }, 'non-positive-dimension', 'gaugeLengthMm'],
    [{ outerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
    [{ offsetMm: 19.5 }, 'position-outside-span', 'offsetMm'],
    [{ offsetMm: Number.NaN }, 'non-finite-input', 'offsetMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => meanMomentRatio({ ...gauge, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
