import { describe, expect, it } from 'vitest';
import { fourPointStrain } from './four-point-strain.ts';
import { relativeStrain } from './relative-strain.ts';
import { threePointStrain } from './three-point-strain.ts';
import { fourPointStrainRatePerS } from './four-point-strain-rate.ts';
import { threePointStrainRatePerS } from './three-point-strain-rate.ts';

const bar = { depthMm: 3, deflectionMm: 0.12, outerSpanMm: 40, innerSpanMm: 20 };

describe('the strain from a deflection', () => {
  it('is 6dδ/L² at three points: 2.16 / 1600', () => {
    expect(threePointStrain(bar)).toBeCloseTo(2.16 / 1600, 12);
  });

  it('is 48/11 dδ/L² at quarter points, 108/23 at third points, read at mid-span', () => {
    expect(fourPointStrain(bar, 'mid-span')).toBeCloseTo((48 / 11) * (0.36 / 1600), 12);
    const thirds = { ...bar, outerSpanMm: 60 };
    expect(fourPointStrain(thirds, 'mid-span')).toBeCloseTo((108 / 23) * (0.36 / 3600), 12);
  });

  it('is 6 dδ/L² at quarter points and 5.4 at third points, read at the inner rollers', () => {
    expect(fourPointStrain(bar, 'inner rollers')).toBeCloseTo((6 * 0.36) / 1600, 12);
    expect(fourPointStrain({ ...bar, outerSpanMm: 60 }, 'inner rollers')).toBeCloseTo((5.4 * 0.36) / 3600, 12);
  });

  it('is the three-point strain when the inner rollers meet, wherever it is read', () => {
    const meeting = { ...bar, innerSpanMm: 0 };
    expect(fourPointStrain(meeting, 'mid-span')).toBeCloseTo(threePointStrain(bar), 12);
    expect(fourPointStrain(meeting, 'inner rollers')).toBeCloseTo(threePointStrain(bar), 12);
  });

  it('is the same whether mid-span is read from the outer rollers or from the inner ones', () => {
    const strain = 1e-3;
    const perStrain = (read: (deflectionMm: number) => number) => strain / (read(0.01) / 0.01);
    const midSpanMm = perStrain((deflectionMm) => fourPointStrain({ ...bar, deflectionMm }, 'mid-span'));
    const innerMm = perStrain((deflectionMm) => fourPointStrain({ ...bar, deflectionMm }, 'inner rollers'));
    expect(relativeStrain({ ...bar, deflectionMm: midSpanMm - innerMm })).toBeCloseTo(strain, 12);
  });

  it.each([
    [{ deflectionMm: Number.NaN }, 'non-finite-input', 'deflectionMm'],
    [{ depthMm: 0 }, 'non-positive-dimension', 'depthMm'],
    [{ outerSpanMm: 0, innerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
    [{ deflectionMm: -0.1 }, 'outside-validity-range', 'deflectionMm'],
    [{ deflectionMm: 4.01 }, 'outside-validity-range', 'deflectionMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => threePointStrain({ ...bar, ...wrong })).toThrow(refusal);
    expect(() => fourPointStrain({ ...bar, ...wrong }, 'mid-span')).toThrow(refusal);
  });

  it('from the inner rollers is refused where they meet', () => {
    const refusal = expect.objectContaining({ code: 'non-positive-span', field: 'innerSpanMm' });
    expect(() => relativeStrain({ ...bar, innerSpanMm: 0 })).toThrow(refusal);
  });
});

describe('the strain rate from the crosshead', () => {
  const driven = { depthMm: 3, crossheadMmPerMin: 0.5, outerSpanMm: 40, innerSpanMm: 20 };

  it('is 6ds/L² at three points and at quarter points: 6 × 3 × 0.5 / 60 / 1600', () => {
    expect(threePointStrainRatePerS(driven)).toBeCloseTo(9 / 60 / 1600, 15);
    expect(fourPointStrainRatePerS(driven)).toBeCloseTo(9 / 60 / 1600, 15);
  });

  it('is the strain that a minute brings, by sixty', () => {
    const strain = fourPointStrain({ ...driven, deflectionMm: 0.5 }, 'inner rollers');
    expect(fourPointStrainRatePerS(driven)).toBeCloseTo(strain / 60, 15);
  });

  it.each([
    [{ crossheadMmPerMin: 0 }, 'non-positive-rate', 'crossheadMmPerMin'],
    [{ crossheadMmPerMin: Number.POSITIVE_INFINITY }, 'non-finite-input', 'crossheadMmPerMin'],
    [{ depthMm: -3, crossheadMmPerMin: 0 }, 'non-positive-dimension', 'depthMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => threePointStrainRatePerS({ ...driven, ...wrong })).toThrow(refusal);
    expect(() => fourPointStrainRatePerS({ ...driven, ...wrong })).toThrow(refusal);
  });
});
