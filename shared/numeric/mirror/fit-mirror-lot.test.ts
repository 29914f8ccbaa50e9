import { describe, expect, it } from 'vitest';
import { fitExponent } from './fit-exponent.ts';
import { fitThroughOrigin } from './fit-through-origin.ts';
import { fitWithIntercept } from './fit-with-intercept.ts';
import { meanConstant } from './mean-constant.ts';

// σ = 2/√R exactly: 1/√R is 100, 50, 25 per √m
const exact = { radiiMm: [0.1, 0.4, 1.6], stressesMPa: [200, 100, 50] };
// the same with 40 MPa more in each, as over a surface in compression
const compressed = { ...exact, stressesMPa: exact.stressesMPa.map((stress) => stress + 40) };
const fits = { fitThroughOrigin, meanConstant, fitWithIntercept, fitExponent };

describe('a lot of mirrors that keep to σ√R = A', () => {
  it('gives A by every fit', () => {
    expect(fitThroughOrigin(exact).mirrorConstantMPaRootM).toBeCloseTo(2, 12);
    expect(meanConstant(exact).meanMPaRootM).toBeCloseTo(2, 12);
    expect(meanConstant(exact).geometricMeanMPaRootM).toBeCloseTo(2, 12);
    expect(fitWithIntercept(exact).mirrorConstantMPaRootM).toBeCloseTo(2, 12);
    expect(fitExponent(exact).exponent).toBeCloseTo(-0.5, 12);
  });

  it('leaves no scatter and so no test', () => {
    expect(fitThroughOrigin(exact).residualSdMPa).toBeCloseTo(0, 10);
    expect(fitWithIntercept(exact).test).toBeUndefined();
    expect(fitExponent(exact).tAgainstMinusHalf).toBeUndefined();
  });
});

describe('a lot of mirrors over a compressed surface', () => {
  it('keeps A as the slope and shows the compression as the intercept turned round', () => {
    const { mirrorConstantMPaRootM, residualStressMPa } = fitWithIntercept(compressed);
    expect(mirrorConstantMPaRootM).toBeCloseTo(2, 11);
    expect(residualStressMPa).toBeCloseTo(-40, 9);
  });

  it('makes the line through the origin too steep and the exponent too flat', () => {
    expect(fitThroughOrigin(compressed).mirrorConstantMPaRootM).toBeGreaterThan(2.3);
    expect(fitExponent(compressed).exponent).toBeGreaterThan(-0.4);
  });
});

describe('the scatter of a lot of mirrors', () => {
  // constants 2.2 and 1.8: mean 2, sd √(2 × 0.2²)
  const two = { radiiMm: [0.1, 0.4], stressesMPa: [220, 90] };

  it('about the mean is counted with n − 1', () => {
    const { meanMPaRootM, sdMPaRootM, standardUncertaintyMPaRootM } = meanConstant(two);
    expect(meanMPaRootM).toBeCloseTo(2, 12);
    expect(sdMPaRootM).toBeCloseTo(Math.sqrt(0.08), 12);
    expect(standardUncertaintyMPaRootM).toBeCloseTo(0.2, 12);
  });

  it('about the line: A = (220·100 + 90·50)/12500 = 2.12, residuals 8 and −16', () => {
    const { mirrorConstantMPaRootM, residualSdMPa, standardUncertaintyMPaRootM } = fitThroughOrigin(two);
    expect(mirrorConstantMPaRootM).toBeCloseTo(2.12, 12);
    expect(residualSdMPa).toBeCloseTo(Math.sqrt(320), 9);
    expect(standardUncertaintyMPaRootM).toBeCloseTo(Math.sqrt(320 / 12500), 11);
  });

  it('does not depend on the order of the mirrors', () => {
    const turned = {
      radiiMm: [...compressed.radiiMm].reverse(),
      stressesMPa: [...compressed.stressesMPa].reverse(),
    };
    expect(fitExponent(turned).uExponent).toBeCloseTo(fitExponent(compressed).uExponent, 12);
  });
});

describe.each(Object.entries(fits))('%s', (name, fit) => {
  const few = name === 'fitWithIntercept' || name === 'fitExponent' ? 2 : 1;

  it.each([
    ['too few mirrors', { radiiMm: [0.1, 0.4].slice(0, few), stressesMPa: [200, 100].slice(0, few) }, 'too-few-points'],
    ['a stress that is missing', { ...exact, stressesMPa: [200, 100] }, 'too-few-points'],
    ['a radius that is missing', { ...exact, radiiMm: [0.1, 0.4] }, 'too-few-points'],
    ['a radius of 0', { ...exact, radiiMm: [0.1, 0, 1.6] }, 'non-positive-mirror-radius'],
    ['a stress of 0', { ...exact, stressesMPa: [200, 100, 0] }, 'non-positive-stress'],
    ['a radius that is no number', { ...exact, radiiMm: [0.1, Number.NaN, 1.6] }, 'non-finite-input'],
    ['an endless stress', { ...exact, stressesMPa: [200, 100, Number.POSITIVE_INFINITY] }, 'non-finite-input'],
  ])('refuses %s', (_what, lot, code) => {
    expect(() => fit(lot)).toThrow(expect.objectContaining({ code }));
  });
});

it.each([[fitWithIntercept], [fitExponent]])('a line is refused where all radii are alike (%o)', (fit) => {
  const alike = { radiiMm: [0.3, 0.3, 0.3], stressesMPa: [100, 101, 99] };
  expect(() => fit(alike)).toThrow(expect.objectContaining({ code: 'outside-validity-range', field: 'radiiMm' }));
});
