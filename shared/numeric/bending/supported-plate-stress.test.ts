import { describe, expect, it } from 'vitest';
import { supportedPlateStressMPa } from './supported-plate-stress.ts';

const plate = { pressureMPa: 0.1, radiusMm: 50, thicknessMm: 4, poissonRatio: 0.23 };

describe('the stress at the centre of a supported plate', () => {
  it('is 3(3 + ν)p(r/t)²/8: 3 × 3.23 × 0.1 × 156.25 / 8', () => {
    expect(supportedPlateStressMPa(plate)).toBeCloseTo((9.69 * 15.625) / 8, 9);
  });

  it('depends on radius and thickness only by their ratio', () => {
    const larger = { ...plate, radiusMm: 100, thicknessMm: 8 };
    expect(supportedPlateStressMPa(larger)).toBeCloseTo(supportedPlateStressMPa(plate), 9);
  });

  it.each([
    [{ pressureMPa: Number.NaN }, 'non-finite-input', 'pressureMPa'],
    [{ thicknessMm: 0 }, 'non-positive-dimension', 'thicknessMm'],
    [{ radiusMm: -50, poissonRatio: 0.6 }, 'non-positive-dimension', 'radiusMm'],
    [{ poissonRatio: 0.5, pressureMPa: -1 }, 'poisson-out-of-range', 'poissonRatio'],
    [{ pressureMPa: -0.1 }, 'negative-load', 'pressureMPa'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => supportedPlateStressMPa({ ...plate, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
