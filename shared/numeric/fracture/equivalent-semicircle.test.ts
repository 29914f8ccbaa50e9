import { describe, expect, it } from 'vitest';
import { equivalentSemicircle } from './equivalent-semicircle.ts';

const flaw = { flawDepthMm: 0.04, flawHalfLengthMm: 0.1 };

describe('the half-circle that stands for a surface flaw', () => {
  it('of the same area is √(0.04 × 0.1) = 0.0632', () => {
    expect(equivalentSemicircle(flaw).byAreaMm).toBeCloseTo(Math.sqrt(0.004), 12);
  });

  it('of a half-circle is itself, both ways', () => {
    const { byAreaMm, byIntensityMm } = equivalentSemicircle({ flawDepthMm: 0.05, flawHalfLengthMm: 0.05 });
    expect(byAreaMm).toBeCloseTo(0.05, 12);
    expect(byIntensityMm).toBeCloseTo(0.05, 12);
  });

  it('grows in step with the flaw', () => {
    const twice = equivalentSemicircle({ flawDepthMm: 0.08, flawHalfLengthMm: 0.2 });
    expect(twice.byIntensityMm).toBeCloseTo(2 * equivalentSemicircle(flaw).byIntensityMm, 12);
  });

  it.each([
    [{ flawDepthMm: Number.NaN }, 'non-finite-input', 'flawDepthMm'],
    [{ flawHalfLengthMm: 0 }, 'non-positive-flaw-size', 'flawHalfLengthMm'],
    [{ flawDepthMm: 0.201 }, 'outside-validity-range', 'flawDepthMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => equivalentSemicircle({ ...flaw, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
