import { describe, expect, it } from 'vitest';
import { peakStressFactor } from './peak-stress-factor.ts';
import { plateCooledStress } from './plate-cooled-stress.ts';
import { plateInstantStressMPa } from './plate-instant-stress.ts';

const quenched = { modulusGPa: 70, expansionPerK: 9e-6, temperatureDropK: 60, poissonRatio: 0.25 };
const cooled = { ...quenched, heatTransferWPerM2K: 1000, halfThicknessMm: 1, conductivityWPerMK: 1 };

describe('the stress of a face cooled at once', () => {
  it('is 70000 × 9e-6 × 60 / 0.75 = 50.4', () => {
    expect(plateInstantStressMPa(quenched)).toBeCloseTo(50.4, 9);
  });

  it('turns its sign with the temperature', () => {
    expect(plateInstantStressMPa({ ...quenched, temperatureDropK: -60 })).toBeCloseTo(-50.4, 9);
    expect(plateInstantStressMPa({ ...quenched, temperatureDropK: 0 })).toBe(0);
  });

  it.each([
    [{ expansionPerK: Number.NaN }, 'non-finite-input', 'expansionPerK'],
    [{ modulusGPa: 0 }, 'outside-validity-range', 'modulusGPa'],
    [{ poissonRatio: 0.5 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ poissonRatio: -0.01 }, 'poisson-out-of-range', 'poissonRatio'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => plateInstantStressMPa({ ...quenched, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the part of it that a fluid reaches', () => {
  // Peak of mean minus surface, conduction series of the infinite plate summed by another program.
  it.each([
    [0.1, 0.0309],
    [0.5, 0.1256],
    [1, 0.2083],
    [2, 0.3166],
    [5, 0.4778],
    [10, 0.5935],
    [20, 0.6928],
    [50, 0.7943],
  ])('at Bi = %d is within 5 %% of %d of the series', (biotNumber, series) => {
    expect(Math.abs(peakStressFactor({ biotNumber }) / series - 1)).toBeLessThan(0.05);
  });

  it('is all of it without end of the heat transfer, and Bi/3.25 with little', () => {
    expect(peakStressFactor({ biotNumber: 1e12 })).toBeCloseTo(1, 9);
    expect(peakStressFactor({ biotNumber: 1e-6 }) * 1e6).toBeCloseTo(1 / 3.25, 5);
  });

  it.each([0, -1, Number.NaN, Number.POSITIVE_INFINITY])('is refused for a Biot number of %d', (biotNumber) => {
    expect(() => peakStressFactor({ biotNumber })).toThrow(expect.objectContaining({ field: 'biotNumber' }));
  });
});

describe('the stress of a face cooled by a fluid', () => {
  it('has a Biot number of 1000 × 0.001 / 1 = 1 and is that part of the instant stress', () => {
    const { biotNumber, peakFactor, stressMPa } = plateCooledStress(cooled);
    expect(biotNumber).toBeCloseTo(1, 12);
    expect(stressMPa).toBeCloseTo(50.4 * peakFactor, 9);
  });

  it.each([
    [{ conductivityWPerMK: Number.NaN }, 'non-finite-input', 'conductivityWPerMK'],
    [{ halfThicknessMm: 0 }, 'non-positive-dimension', 'halfThicknessMm'],
    [{ heatTransferWPerM2K: 0 }, 'outside-validity-range', 'heatTransferWPerM2K'],
    [{ conductivityWPerMK: -1 }, 'outside-validity-range', 'conductivityWPerMK'],
    [{ modulusGPa: 0 }, 'outside-validity-range', 'modulusGPa'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => plateCooledStress({ ...cooled, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
