import { describe, expect, it } from 'vitest';
import { compareTriple } from './compare-triple.ts';

const three = (load: number, mirror: number, flaw: number, uMPa = 10) =>
  compareTriple([
    { line: 'load', stressMPa: load, uMPa },
    { line: 'mirror', stressMPa: mirror, uMPa },
    { line: 'flaw', stressMPa: flaw, uMPa },
  ]);

describe('three stresses', () => {
  it('of equal uncertainty have their mean in common, known √3 times better', () => {
    const { pooled, chiSquared } = three(290, 300, 310);
    expect(pooled?.stressMPa).toBeCloseTo(300, 9);
    expect(pooled?.standardUncertaintyMPa).toBeCloseTo(10 / Math.sqrt(3), 9);
    expect(chiSquared).toBeCloseTo(2, 9);
  });

  it('have no common value when they spread more than chance allows', () => {
    // ±25 MPa about the middle: χ² = 2 × 2.5² = 12.5, over 5.991
    expect(three(275, 300, 325).pooled).toBeUndefined();
  });

  it.each([
    ['all-agree', 300, 305, 310, 'all-agree'],
    ['a high flaw', 300, 305, 400, 'outlier'],
    ['a chain', 280, 300, 320, 'ambiguous'],
    ['three apart', 200, 300, 400, 'none-agree'],
  ])('show %s', (_what, load, mirror, flaw, kind) => {
    expect(three(load, mirror, flaw).pattern.kind).toBe(kind);
  });

  it('are read the same in other units of the same kind', () => {
    const inKPa = compareTriple([
      { line: 'load', stressMPa: 290e3, uMPa: 10e3 },
      { line: 'mirror', stressMPa: 300e3, uMPa: 10e3 },
      { line: 'flaw', stressMPa: 310e3, uMPa: 10e3 },
    ]);
    inKPa.zetas.forEach((zeta, index) => expect(zeta).toBeCloseTo(three(290, 300, 310).zetas[index] ?? Number.NaN, 9));
  });

  it('are refused without uncertainties', () => {
    expect(() => three(300, 300, 300, 0)).toThrow(expect.objectContaining({ code: 'missing-uncertainty' }));
    expect(() => three(Number.NaN, 300, 300)).toThrow(expect.objectContaining({ code: 'non-finite-input' }));
  });
});
