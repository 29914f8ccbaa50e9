import { describe, expect, it } from 'vitest';
import { evaluateMethod, runMethod } from './evaluate-method.ts';
import { findCurrentMethod, methods } from './methods.ts';
import type { GivenInputs, Method } from './methods/method.ts';

function exactly(inputs: Record<string, number>): GivenInputs {
  return Object.fromEntries(Object.entries(inputs).map(([name, value]) => [name, { value, standardUncertainty: 0 }]));
}

function cautionsOf(id: string, given: GivenInputs): string[] {
  const answer = evaluateMethod(id, 1, given);
  return answer.kind === 'value' ? answer.cautions.map((caution) => caution.code) : [`refused ${answer.code}`];
}

const bar = { load: 500, outerSpan: 40, innerSpan: 20, width: 4, depth: 3 };
const origin = { ...bar, x: 0, y: 0 };
const { innerSpan: _innerSpan, ...bar3 } = bar;

describe('the table of methods', () => {
  it('lists each id and version once', () => {
    const keys = methods.map((method) => `${method.id} ${method.version}`);
    expect(new Set(keys).size).toBe(keys.length);
  });

  it('gives every main output a unit and every input and output a label', () => {
    for (const method of methods) {
      const main = method.outputs.find((output) => output.name === method.mainOutput);
      if (method.line !== 'supporting') expect(main?.unit).toBe('MPa');
      if (method.mainOutput !== undefined) expect(main?.unit, method.id).toBeTruthy();
      for (const named of [...method.inputs, ...method.outputs]) expect(named.label).not.toBe('');
    }
  });

  it('finds the newest version for a new estimate', () => {
    expect(findCurrentMethod('bend4.rect')?.version).toBe(1);
    expect(findCurrentMethod('bend5')).toBeUndefined();
  });
});

describe('a method that is run', () => {
  it('gives the outputs but no estimate while an uncertainty is not stated', () => {
    const answer = evaluateMethod('mirror.stress', 1, {
      A: { value: 2, standardUncertainty: 0.1 },
      R: { value: 0.25 },
    });
    expect(answer).toMatchObject({ kind: 'value', estimated: null, budget: [], uncertaintyNotStated: ['R'] });
  });

  it('gives the estimate and its budget when all are stated', () => {
    const given = { A: { value: 2, standardUncertainty: 0.06 }, R: { value: 0.25, standardUncertainty: 0.02 } };
    const answer = evaluateMethod('mirror.stress', 1, given);
    if (answer.kind !== 'value' || !answer.estimated) throw new Error('expected an estimate');
    // relative: 3 % from A, 8 %/2 = 4 % from R, together 5 %
    expect(answer.estimated.standardUncertainty / answer.estimated.value).toBeCloseTo(0.05, 12);
    expect(answer.budget.map((row) => row.input)).toEqual(['R', 'A']);
  });

  it('refuses by the name of the input, not of the argument', () => {
    expect(evaluateMethod('bend4.rect', 1, exactly({ ...bar, depth: 0 }))).toEqual({
      kind: 'refused',
      code: 'non-positive-dimension',
      field: 'depth',
    });
  });

  it.each([
    ['a missing input', 'bend4.rect', exactly({ ...bar3 }), 'non-finite-input', 'innerSpan'],
    ['an input it does not know', 'bend3.rect', exactly(bar), 'unknown-input', 'innerSpan'],
    [
      'a negative uncertainty',
      'bend3.rect',
      { ...exactly(bar3), load: { value: 1, standardUncertainty: -1 } },
      'negative-uncertainty',
      'load',
    ],
    [
      'an uncertainty that is no number',
      'bend3.rect',
      { ...exactly(bar3), load: { value: 1, standardUncertainty: Number.NaN } },
      'non-finite-input',
      'load',
    ],
    [
      'a number too large to hold',
      'bend3.rect',
      exactly({ ...bar3, depth: 1e-200 }),
      'outside-validity-range',
      'stress',
    ],
    [
      'a depth of zero beside a mirror',
      'mirror.stress',
      exactly({ A: 2, R: 0.25, depth: 0 }),
      'non-positive-dimension',
      'depth',
    ],
    ['a method that is not there', 'bend5', exactly(bar), 'unknown-method', 'bend5'],
  ])('refuses %s', (_what, id, given, code, field) => {
    expect(evaluateMethod(id, 1, given)).toEqual({ kind: 'refused', code, field });
  });

  it('refuses a version that was never there', () => {
    expect(evaluateMethod('bend4.rect', 2, exactly(bar))).toMatchObject({ kind: 'refused', code: 'unknown-method' });
  });

  it('takes the default of an input that has one, as exact', () => {
    const plain = methods.find((method) => method.id === 'mirror.stress');
    if (!plain) throw new Error('expected the mirror method');
    const inputs = plain.inputs.map((input) =>
      input.name === 'R' && input.kind === 'number' ? { ...input, default: 0.25 } : input,
    );
    const withDefault: Method = { ...plain, inputs };
    expect(runMethod(withDefault, exactly({ A: 2 }))).toMatchObject({ kind: 'value', uncertaintyNotStated: [] });
  });

  it('lets a fault in its own making through', () => {
    const plain = methods.find((method) => method.id === 'mirror.stress');
    if (!plain) throw new Error('expected the mirror method');
    const broken: Method = {
      ...plain,
      run: () => {
        throw new TypeError('broken');
      },
    };
    expect(() => runMethod(broken, exactly({ A: 2, R: 1 }))).toThrow(TypeError);
  });
});

describe('a bar method cautions', () => {
  it('nothing for an ordinary bar', () => {
    expect(cautionsOf('bend4.rect', exactly(bar))).toEqual([]);
    expect(cautionsOf('bend4.rect.local', exactly(origin))).toEqual([]);
  });

  it.each([
    ['a zero load', 'bend4.rect', { ...bar, load: 0 }, 'zero-load'],
    ['a depth above the width', 'bend4.rect', { ...bar, width: 3, depth: 4 }, 'depth-above-width'],
    ['a short moment arm', 'bend4.rect', { ...bar, depth: 4.1, width: 5 }, 'short-arm'],
    ['a short span', 'bend3.rect', { ...bar3, outerSpan: 29 }, 'short-span'],
    ['an origin in compression', 'bend4.rect.local', { ...origin, y: 1.6 }, 'origin-in-compression'],
    ['an origin outside the inner span', 'bend4.rect.local', { ...origin, x: 15 }, 'outside-inner-span'],
    ['an origin near an inner roller', 'bend4.rect.local', { ...origin, x: 9 }, 'contact-zone'],
    ['an origin within a depth of an inner roller', 'bend4.rect.local', { ...origin, x: -7.5 }, 'wedging'],
    ['an origin under the loading roller', 'bend3.rect.local', { ...bar3, x: 2, y: 0 }, 'wedging'],
  ])('about %s', (_what, id, inputs, caution) => {
    expect(cautionsOf(id, exactly(inputs))).toContain(caution);
  });

  it('about first order while the position is within twice its uncertainty of mid-span', () => {
    const near = { ...exactly({ ...bar3, y: 0 }), x: { value: 0.39, standardUncertainty: 0.2 } };
    const clear = { ...exactly({ ...bar3, y: 0 }), x: { value: 0.41, standardUncertainty: 0.2 } };
    expect(cautionsOf('bend3.rect.local', near)).toContain('first-order-at-peak');
    expect(cautionsOf('bend3.rect.local', clear)).not.toContain('first-order-at-peak');
  });
});

describe('an image method cautions', () => {
  it('about a mirror that is large against the section, twice', () => {
    expect(cautionsOf('mirror.stress', exactly({ A: 8.5, R: 0.29, depth: 3 }))).toEqual([]);
    expect(cautionsOf('mirror.stress', exactly({ A: 8.5, R: 0.56, depth: 3 }))).toEqual(['mirror-in-gradient']);
    expect(cautionsOf('mirror.stress', exactly({ A: 8.5, R: 1.95, depth: 2.98 }))).toEqual(['large-mirror']);
  });

  it('about a mirror that is small against its flaw, and a flaw that is small against the grains', () => {
    expect(cautionsOf('mirror.stress', exactly({ A: 8.5, R: 0.3, c: 0.07 }))).toEqual(['flaw-large-against-mirror']);
    const flaw = { KIc: 3.5, Y: 1.29, c: 0.03, grainSize: 0.007 };
    expect(cautionsOf('flaw.stress', exactly(flaw))).toEqual(['flaw-small-against-grain']);
  });
});
