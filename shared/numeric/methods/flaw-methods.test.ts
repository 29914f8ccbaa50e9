import { describe, expect, it } from 'vitest';
import { evaluateMethod } from '../evaluate-method.ts';
import type { GivenInputs } from './method.ts';

function exactly(inputs: Record<string, number>): GivenInputs {
  return Object.fromEntries(Object.entries(inputs).map(([name, value]) => [name, { value, standardUncertainty: 0 }]));
}

function cautionsOf(id: string, inputs: Record<string, number>): string[] {
  const answer = evaluateMethod(id, 1, exactly(inputs));
  return answer.kind === 'value' ? answer.cautions.map((caution) => caution.code) : [`refused ${answer.code}`];
}

const bar = { load: 520, outerSpan: 40, innerSpan: 20, width: 4, depth: 3, x: 0, y: 0.11 };

describe('a method about flaws cautions', () => {
  it('about an inner flaw close to the face, which counts as a surface flaw', () => {
    expect(cautionsOf('flaw.apparentToughness.embedded', { ...bar, a: 0.045 })).toEqual([]);
    expect(cautionsOf('flaw.apparentToughness.embedded', { ...bar, a: 0.08 })).toEqual(['flaw-near-surface']);
    expect(cautionsOf('flaw.apparentToughness.embedded', { ...bar, a: 0.12 })).toEqual([
      'refused outside-validity-range',
    ]);
  });

  it('about a front that would be pressed shut', () => {
    const penny = { stressAtCentre: 100, a: 0.5 };
    expect(cautionsOf('K.penny.gradient', { ...penny, gradient: 200 })).toEqual([]);
    expect(cautionsOf('K.penny.gradient', { ...penny, gradient: 400 })).toEqual(['front-partly-closed']);
  });

  it('about a flaw shallower than the equations are stated for', () => {
    expect(cautionsOf('flaw.equivalentSemicircle', { a: 0.01, c: 0.1 })).toEqual(['shallow-crack']);
    const flaw = { KIc: 3.5, stress: 350, aOverC: 0.1, t: 3, halfWidth: 2 };
    expect(cautionsOf('flaw.size.surface.bending', flaw)).toEqual(['shallow-crack']);
  });

  it('about the bracket of a pore, always', () => {
    const pore = { poreRadius: 0.04, crackLength: 0.008, poisson: 0.25 };
    expect(cautionsOf('flaw.pore.bracket', pore)).toEqual(['interpolation-of-practice']);
  });
});

describe('the apparent toughness as a method', () => {
  it('carries the uncertainty of the bar and of the flaw', () => {
    const answer = evaluateMethod('flaw.apparentToughness.embedded', 1, {
      ...exactly(bar),
      load: { value: 520, standardUncertainty: 5.2 },
      a: { value: 0.045, standardUncertainty: 0.0045 },
    });
    if (answer.kind !== 'value' || !answer.estimated) throw new Error('expected an estimate');
    // relative: 1 % from the load, 10 %/2 = 5 % from the radius
    expect(answer.estimated.standardUncertainty / answer.estimated.value).toBeCloseTo(Math.hypot(0.01, 0.05), 9);
    expect(answer.estimated.unit).toBe('MPa√m');
  });
});
