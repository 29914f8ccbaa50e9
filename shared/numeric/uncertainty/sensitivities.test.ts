import { describe, expect, it } from 'vitest';
import { evaluateMethod } from '../evaluate-method.ts';
import { methods } from '../methods.ts';
import type { GivenInputs } from '../methods/method.ts';

const bar = { load: 500, outerSpan: 40, width: 4, depth: 3 };
const rod = { load: 300, outerSpan: 40, diameter: 3 };
const points: { id: string; inputs: Record<string, number> }[] = [
  { id: 'bend3.rect', inputs: bar },
  { id: 'bend4.rect', inputs: { ...bar, innerSpan: 20 } },
  { id: 'bend3.rect.local', inputs: { ...bar, x: -3.2, y: 0.15 } },
  { id: 'bend3.rect.local', inputs: { ...bar, x: 5, y: 2.5 } },
  { id: 'bend4.rect.local', inputs: { ...bar, innerSpan: 20, x: 4, y: 0.2 } },
  { id: 'bend4.rect.local', inputs: { ...bar, innerSpan: 20, x: -14, y: 0.2 } },
  { id: 'bend3.rod', inputs: rod },
  { id: 'bend4.rod', inputs: { ...rod, innerSpan: 20 } },
  { id: 'bend3.rod.local', inputs: { ...rod, x: -4, y: 0.4 } },
  { id: 'bend4.rod.local', inputs: { ...rod, innerSpan: 20, x: 4, y: 0.4 } },
  { id: 'bend4.rod.local', inputs: { ...rod, innerSpan: 20, x: -14, y: 0.4 } },
  { id: 'bend4.rod.local.angle', inputs: { ...rod, innerSpan: 20, x: 13, angle: 25 } },
  { id: 'cantilever.rod', inputs: { load: 25, arm: 60, diameter: 6 } },
  { id: 'plate.supported.pressure', inputs: { pressure: 0.1, radius: 50, thickness: 4, poisson: 0.23 } },
  {
    id: 'disc.ringOnRing',
    inputs: { load: 1000, thickness: 2, poisson: 0.22, supportDiameter: 30, loadDiameter: 10, discDiameter: 36 },
  },
  {
    id: 'disc.pistonOnThreeBalls',
    inputs: { load: 500, thickness: 1.2, poisson: 0.25, supportRadius: 5, pistonRadius: 0.7, discRadius: 7 },
  },
  { id: 'mirror.stress', inputs: { A: 8.5, R: 0.56 } },
  { id: 'mirror.residual', inputs: { A: 1.9, R: 0.3, appliedStress: 140 } },
  { id: 'flaw.stress', inputs: { KIc: 3.5, Y: 1.29, c: 0.064 } },
];

function givenFrom(inputs: Record<string, number>): GivenInputs {
  return Object.fromEntries(Object.entries(inputs).map(([name, value]) => [name, { value, standardUncertainty: 0 }]));
}

function stressOf(id: string, inputs: Record<string, number>): number {
  const answer = evaluateMethod(id, 1, givenFrom(inputs));
  return answer.kind === 'value' && answer.estimated ? answer.estimated.value : Number.NaN;
}

describe('the sensitivities of the stress methods', () => {
  it.each(points)('of $id at $inputs agree with small steps either way', ({ id, inputs }) => {
    const method = methods.find((each) => each.id === id);
    const analytic = method?.sensitivities?.(givenFrom(inputs)) ?? {};
    expect(Object.keys(analytic).sort()).toEqual(Object.keys(inputs).sort());
    for (const [name, value] of Object.entries(inputs)) {
      const step = 1e-5 * (Math.abs(value) || 1);
      const up = stressOf(id, { ...inputs, [name]: value + step });
      const down = stressOf(id, { ...inputs, [name]: value - step });
      const numeric = (up - down) / (2 * step);
      // central differences: the error is of the order of the step squared, plus rounding of the difference
      expect(Math.abs((analytic[name] ?? Number.NaN) - numeric)).toBeLessThan(1e-6 * Math.max(1, Math.abs(numeric)));
    }
  });

  it('for the load is the same at zero load', () => {
    const method = methods.find((each) => each.id === 'bend4.rect');
    const atZero = method?.sensitivities?.(givenFrom({ ...bar, innerSpan: 20, load: 0 }));
    expect(atZero?.load).toBeCloseTo((3 * 20) / (2 * 4 * 9), 12);
  });

  it('for the position at mid-span of a three-point bar is the slope beside the peak, not zero', () => {
    const method = methods.find((each) => each.id === 'bend3.rect.local');
    const atPeak = method?.sensitivities?.(givenFrom({ ...bar, x: 0, y: 0 }));
    expect(atPeak?.x).toBeCloseTo((-2 / 40) * ((3 * 500 * 40) / 72), 9);
  });
});
