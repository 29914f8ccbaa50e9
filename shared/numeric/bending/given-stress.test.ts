import { describe, expect, it } from 'vitest';
import { givenStressMPa } from './given-stress.ts';

describe('a stress given by an analysis', () => {
  it('passes as it is', () => {
    expect(givenStressMPa({ stressMPa: 2400, standardUncertaintyMPa: 168 })).toBe(2400);
  });

  it.each([
    [2400, undefined, 'missing-uncertainty'],
    [2400, 0, 'missing-uncertainty'],
    [2400, Number.NaN, 'missing-uncertainty'],
    [0, 168, 'non-positive-stress'],
    [-5, undefined, 'non-positive-stress'],
    [Number.POSITIVE_INFINITY, 168, 'non-finite-input'],
  ])('of %s ± %s is refused', (stressMPa, standardUncertaintyMPa, code) => {
    const refusal = expect.objectContaining({ code, field: 'stressMPa' });
    expect(() => givenStressMPa({ stressMPa, standardUncertaintyMPa })).toThrow(refusal);
  });
});
