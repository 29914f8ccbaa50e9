import { describe, expect, it } from 'vitest';
import { evaluateMethod } from '../evaluate-method.ts';
import type { GivenInputs } from './method.ts';

const crack: GivenInputs = { a: { value: 0.1 }, c: { value: 0.1 }, t: { value: 3 }, mode: { code: 'bending' } };

function cautionsOf(id: string, given: GivenInputs): string[] {
  const answer = evaluateMethod(id, 1, given);
  return answer.kind === 'value' ? answer.cautions.map((caution) => caution.code) : [`refused ${answer.code}`];
}

describe('the shape factor of a crack as a method', () => {
  it('says which place governs, and that the surface value is a fit', () => {
    const answer = evaluateMethod('Y.surface.newmanRaju', 1, crack);
    expect(answer).toMatchObject({ kind: 'value', outputs: { governs: 'surface', phiMax: 0 }, estimated: null });
    expect(cautionsOf('Y.surface.newmanRaju', crack)).toEqual(['surface-governs']);
  });

  it('takes one place on the front only when it is asked for', () => {
    const answer = evaluateMethod('Y.surface.newmanRaju', 1, { ...crack, phi: { value: 45 } });
    expect(answer).toMatchObject({ kind: 'value', outputs: { Q: 2.464 } });
    expect(evaluateMethod('Y.corner.newmanRaju', 1, crack)).not.toHaveProperty('outputs.Q');
  });

  it('warns where no accuracy is stated', () => {
    expect(cautionsOf('Y.surface.newmanRaju', { ...crack, c: { value: 1 } })).toContain('shallow-crack');
    const deep = { ...crack, a: { value: 2.5 }, c: { value: 2.5 } };
    expect(cautionsOf('Y.surface.newmanRaju', deep)).toContain('deep-crack');
    expect(cautionsOf('Y.corner.newmanRaju', deep)).toEqual(['deep-crack']);
  });

  it.each([
    ['no loading', { ...crack, mode: { value: 1 } }, 'not-a-choice', 'mode'],
    ['a loading it does not know', { ...crack, mode: { code: 'torsion' } }, 'not-a-choice', 'mode'],
    ['a width of zero', { ...crack, halfWidth: { value: 0 } }, 'non-positive-dimension', 'halfWidth'],
    ['a place beyond the front', { ...crack, phi: { value: 100 } }, 'outside-validity-range', 'phi'],
    ['a crack through the section', { ...crack, a: { value: 3 } }, 'flaw-deeper-than-section', 'a'],
  ])('refuses %s by the name of the input', (_what, given, code, field) => {
    expect(evaluateMethod('Y.surface.newmanRaju', 1, given)).toEqual({ kind: 'refused', code, field });
  });
});
