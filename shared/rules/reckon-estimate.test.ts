import { describe, expect, it } from 'vitest';
import { bend3RectLocal } from '../numeric/methods/bend3-rect-local.ts';
import { bend4Rect } from '../numeric/methods/bend4-rect.ts';
import { flawStress } from '../numeric/methods/flaw-stress.ts';
import type { GivenInputs } from '../numeric/methods/method.ts';
import { reckonEstimate } from './reckon-estimate.ts';

const within = (value: number, standardUncertainty: number) => ({ value, standardUncertainty });
const bar: GivenInputs = {
  load: within(400, 4),
  outerSpan: within(40, 0.1),
  width: within(4, 0.01),
  depth: within(3, 0.01),
};
const stresses = (given: GivenInputs, method = bend3RectLocal) => {
  const reckoned = reckonEstimate(method, given);
  if (reckoned.kind === 'refused') throw new Error(reckoned.code);
  return reckoned.outputs.filter((output) => output.unit === 'MPa');
};

describe('the stresses of a bent bar', () => {
  it('come as that on the tensile face and that at the origin, each with its own uncertainty', () => {
    const [face, origin] = stresses({ ...bar, x: within(0, 0), y: within(0.75, 0.02) });
    // 3 F L / 2 b d² = 3 × 400 × 40 / (2 × 4 × 9) = 666.7 MPa; half of it at a quarter of the depth
    expect(face).toMatchObject({ name: 'outerFibreStress', value: expect.closeTo(666.667, 2) });
    expect(origin).toMatchObject({ name: 'originStress', value: expect.closeTo(333.333, 2) });
    expect(face?.standardUncertainty).not.toBe(origin?.standardUncertainty);
  });

  it('are one where the origin is taken at the face', () => {
    const [face, origin] = stresses({ ...bar, innerSpan: within(20, 0.1) }, bend4Rect);
    expect(face?.value).toBe(origin?.value);
    expect(face?.standardUncertainty).toBe(origin?.standardUncertainty);
  });
});

describe('an estimate', () => {
  it('is refused while an uncertainty is not stated, by the label of the input', () => {
    const given = { KIc: within(3.5, 0.1), Y: { value: 1.29 }, c: within(0.064, 0.006) };
    expect(reckonEstimate(flawStress, given)).toMatchObject({ code: 'missing-uncertainty', label: 'Shape factor' });
  });

  it('is refused when all is said to be exact, since a stress never goes without its interval', () => {
    const given = { KIc: within(3.5, 0), Y: within(1.29, 0), c: within(0.064, 0) };
    expect(reckonEstimate(flawStress, given)).toMatchObject({ kind: 'refused', code: 'missing-uncertainty' });
  });
});
