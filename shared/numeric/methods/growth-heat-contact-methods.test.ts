import { describe, expect, it } from 'vitest';
import { evaluateMethod } from '../evaluate-method.ts';
import { findMethod } from '../methods.ts';
import type { GivenInputs } from './method.ts';

function exactly(inputs: Record<string, number>): GivenInputs {
  return Object.fromEntries(Object.entries(inputs).map(([name, value]) => [name, { value, standardUncertainty: 0 }]));
}

function cautionsOf(id: string, inputs: Record<string, number>): string[] {
  const answer = evaluateMethod(id, 1, exactly(inputs));
  return answer.kind === 'value' ? answer.cautions.map((caution) => caution.code) : [`refused ${answer.code}`];
}

const instant = { E: 70, alpha: 9e-6, deltaT: 60, poisson: 0.22 };
const cooled = { ...instant, h: 1500, halfThickness: 3, conductivity: 1.1 };
const sphere = { load: 100, radius: 2.5, E1: 600, nu1: 0.22, E2: 70, nu2: 0.24 };
const rate = { stress: 85, rate: 1, targetRate: 100, n: 16 };

describe('the sensitivities of growth, heat and contact', () => {
  it.each([
    ['scg.rateCorrection', rate],
    ['thermal.plateInstant', instant],
    ['thermal.plateBiot', cooled],
    ['hertz.sphere', sphere],
  ])('of %s agree with small steps either way', (id, inputs: Record<string, number>) => {
    const slopes = findMethod(id, 1)?.sensitivities?.(exactly(inputs)) ?? {};
    expect(Object.keys(slopes).sort()).toEqual(Object.keys(inputs).sort());
    const valueAt = (changed: Record<string, number>) => {
      const answer = evaluateMethod(id, 1, exactly(changed));
      return answer.kind === 'value' && answer.estimated ? answer.estimated.value : Number.NaN;
    };
    for (const [name, value] of Object.entries(inputs)) {
      const step = 1e-5 * value;
      const up = valueAt({ ...inputs, [name]: value + step });
      const numeric = (up - valueAt({ ...inputs, [name]: value - step })) / (2 * step);
      // central differences: the error is of the order of the step squared, plus rounding of the difference
      expect(Math.abs((slopes[name] ?? Number.NaN) / numeric - 1)).toBeLessThan(1e-6);
    }
  });

  it('of a contact without load are refused, for the slope has no end there', () => {
    const refused = { kind: 'refused', code: 'outside-validity-range', field: 'load' };
    expect(evaluateMethod('hertz.sphere', 1, exactly({ ...sphere, load: 0 }))).toEqual(refused);
  });
});

describe('a method of heat or contact cautions', () => {
  it('about a face that is heated', () => {
    expect(cautionsOf('thermal.plateInstant', instant)).toEqual([]);
    expect(cautionsOf('thermal.plateInstant', { ...instant, deltaT: -60 })).toEqual(['face-heated']);
  });

  it('about a Biot number at which the fit was not compared', () => {
    expect(cautionsOf('thermal.psi', { biot: 50 })).toEqual([]);
    expect(cautionsOf('thermal.psi', { biot: 51 })).toEqual(['biot-not-compared']);
    expect(cautionsOf('thermal.plateBiot', { ...cooled, h: 10 })).toEqual(['biot-not-compared']);
  });

  it('about comparing the edge of a contact with a bend strength, always', () => {
    expect(cautionsOf('hertz.sphere', sphere)).toEqual(['no-bend-strength']);
    const noLoad = Object.fromEntries(Object.entries({ ...sphere, load: 0 }).map(([name, value]) => [name, { value }]));
    const answer = evaluateMethod('hertz.sphere', 1, noLoad);
    if (answer.kind !== 'value') throw new Error('expected a value');
    expect(answer.cautions.map((caution) => caution.code)).toContain('zero-load');
  });
});
