import { describe, expect, it } from 'vitest';
import { edgeCrackBending } from './edge-crack-bending.ts';
import { edgeCrackTension } from './edge-crack-tension.ts';

describe('the shape factor of an edge crack', () => {
  it('of no depth is 1.1215 √π within 0.2 %, in both loadings', () => {
    const exact = 1.1215 * Math.sqrt(Math.PI);
    expect(Math.abs(edgeCrackBending({ depthOverSection: 0 }) / exact - 1)).toBeLessThan(2e-3);
    expect(Math.abs(edgeCrackTension({ depthOverSection: 0 }) / exact - 1)).toBeLessThan(2e-3);
  });

  it('in bending agrees with the form of Tada within 0.2 % up to 0.6', () => {
    for (let ratio = 0; ratio <= 0.6; ratio += 0.05) {
      const tada =
        Math.sqrt(Math.PI) * (1.122 - 1.4 * ratio + 7.33 * ratio ** 2 - 13.08 * ratio ** 3 + 14 * ratio ** 4);
      expect(Math.abs(edgeCrackBending({ depthOverSection: ratio }) / tada - 1)).toBeLessThan(2.1e-3);
    }
  });

  it('in tension rises with depth', () => {
    const factors = [0.05, 0.2, 0.4, 0.6].map((depthOverSection) => edgeCrackTension({ depthOverSection }));
    expect(factors).toEqual([...factors].sort((one, other) => one - other));
  });

  it.each([
    [Number.NaN, 'non-finite-input'],
    [Number.POSITIVE_INFINITY, 'non-finite-input'],
    [-0.01, 'outside-validity-range'],
    [0.61, 'outside-validity-range'],
    [1, 'flaw-deeper-than-section'],
  ])('is refused at %d', (depthOverSection, code) => {
    const refused = expect.objectContaining({ code, field: 'depthOverSection' });
    expect(() => edgeCrackBending({ depthOverSection })).toThrow(refused);
    expect(() => edgeCrackTension({ depthOverSection })).toThrow(refused);
  });
});
