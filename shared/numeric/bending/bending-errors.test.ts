import { describe, expect, it } from 'vitest';
import { fourPointFrictionError } from './four-point-friction-error.ts';
import { threePointFrictionError } from './three-point-friction-error.ts';
import { largeDeflectionFactor } from './large-deflection-factor.ts';
import { fourPointWedgingError } from './four-point-wedging-error.ts';
import { threePointWedgingError } from './three-point-wedging-error.ts';

const bar = { frictionCoefficient: 0.2, depthMm: 3, outerSpanMm: 40, innerSpanMm: 20 };

describe('the error of bearings that cannot roll', () => {
  it('is −μd/a at four points, 0.2 × 3/10, and −4μd/3L at three, 2.4/120', () => {
    expect(fourPointFrictionError(bar)).toBeCloseTo(-0.06, 12);
    expect(threePointFrictionError(bar)).toBeCloseTo(-0.02, 12);
  });

  it('is nothing without friction', () => {
    expect(fourPointFrictionError({ ...bar, frictionCoefficient: 0 })).toBeCloseTo(0, 12);
  });

  it.each([
    [{ frictionCoefficient: Number.NaN }, 'non-finite-input', 'frictionCoefficient'],
    [{ frictionCoefficient: -0.1 }, 'outside-validity-range', 'frictionCoefficient'],
    [{ depthMm: 0 }, 'non-positive-dimension', 'depthMm'],
    [{ outerSpanMm: -40 }, 'non-positive-span', 'outerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => threePointFrictionError({ ...bar, ...wrong })).toThrow(refusal);
    expect(() => fourPointFrictionError({ ...bar, ...wrong })).toThrow(refusal);
  });
});

describe('the error of wedging', () => {
  it('is −1.3 % for 3 mm on 40 mm, and the same on 40 and 20 mm', () => {
    expect(threePointWedgingError(bar)).toBeCloseTo(-0.01307, 5);
    expect(fourPointWedgingError(bar)).toBeCloseTo(threePointWedgingError(bar), 12);
  });

  it('halves on twice the span', () => {
    const longer = threePointWedgingError({ depthMm: 3, outerSpanMm: 80 });
    expect(longer).toBeCloseTo(threePointWedgingError(bar) / 2, 12);
  });

  it.each([
    [{ depthMm: Number.POSITIVE_INFINITY }, 'non-finite-input', 'depthMm'],
    [{ depthMm: 0, outerSpanMm: 0 }, 'non-positive-dimension', 'depthMm'],
    [{ outerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const refusal = expect.objectContaining({ code, field });
    expect(() => threePointWedgingError({ ...bar, ...wrong })).toThrow(refusal);
    expect(() => fourPointWedgingError({ ...bar, ...wrong })).toThrow(refusal);
  });
});

describe('the moment at a large deflection', () => {
  it('is 1 + 6(δ/L)²: 1 + 6/900 for 2 mm on 60', () => {
    expect(largeDeflectionFactor({ deflectionMm: 2, outerSpanMm: 60 })).toBeCloseTo(1 + 6 / 900, 12);
  });

  it.each([
    [{ deflectionMm: 6.01 }, 'outside-validity-range', 'deflectionMm'],
    [{ deflectionMm: -1 }, 'outside-validity-range', 'deflectionMm'],
    [{ deflectionMm: Number.NaN }, 'non-finite-input', 'deflectionMm'],
    [{ outerSpanMm: 0 }, 'non-positive-span', 'outerSpanMm'],
  ])('is refused for %o', (wrong, code, field) => {
    const bent = { deflectionMm: 2, outerSpanMm: 60, ...wrong };
    expect(() => largeDeflectionFactor(bent)).toThrow(expect.objectContaining({ code, field }));
  });
});
