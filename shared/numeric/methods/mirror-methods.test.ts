import { describe, expect, it } from 'vitest';
import { evaluateMethod } from '../evaluate-method.ts';
import type { GivenInputs } from './method.ts';

function cautionsOf(id: string, given: GivenInputs): string[] {
  const answer = evaluateMethod(id, 1, given);
  return answer.kind === 'value' ? answer.cautions.map((caution) => caution.code) : [`refused ${answer.code}`];
}

const numbers = (given: Record<string, number>): GivenInputs =>
  Object.fromEntries(Object.entries(given).map(([name, value]) => [name, { value }]));

// σ = 2/√R with one part in a hundred of scatter, over a sixteenfold range of R
const radii = [0.1, 0.13, 0.17, 0.22, 0.3, 0.4, 0.55, 0.75, 1.1, 1.6];
const stresses = radii.map((radius, index) => (2 / Math.sqrt(radius / 1000)) * (1 + (index % 2 === 0 ? 0.01 : -0.01)));
const lot: GivenInputs = { R: { values: radii }, stress: { values: stresses } };
const compressed: GivenInputs = { R: { values: radii }, stress: { values: stresses.map((stress) => stress + 60) } };
const first = (count: number): GivenInputs => ({
  R: { values: radii.slice(0, count) },
  stress: { values: stresses.slice(0, count) },
});

describe('a lot of mirrors cautions', () => {
  it.each(['mirror.fit.origin', 'mirror.fit.mean', 'mirror.fit.intercept', 'mirror.fit.loglog'])(
    'nothing for ten over a wide range (%s), and about few over a narrow one',
    (id) => {
      expect(cautionsOf(id, lot)).toEqual([]);
      expect(cautionsOf(id, first(5))).toEqual(['few-mirrors', 'narrow-range-of-radii']);
    },
  );

  it('about an intercept that is not zero and an exponent that is not −½', () => {
    expect(cautionsOf('mirror.fit.intercept', compressed)).toEqual(['intercept-not-zero']);
    expect(cautionsOf('mirror.fit.loglog', compressed)).toEqual(['exponent-not-minus-half']);
  });
});

describe('a mirror method cautions', () => {
  it('about a mirror that is oddly large or small against its flaw', () => {
    expect(cautionsOf('mirror.flawRatio', numbers({ A: 2, KIc: 0.8, Y: 1.28 }))).toEqual([]);
    expect(cautionsOf('mirror.flawRatio', numbers({ A: 5, KIc: 0.8, Y: 1.28 }))).toEqual(['unusual-flaw-ratio']);
  });

  it('about an inner edge outside the outer one', () => {
    expect(cautionsOf('mirror.flawRatio.band', numbers({ ratioInner: 10, ratioOuter: 13 }))).toEqual([]);
    expect(cautionsOf('mirror.flawRatio.band', numbers({ ratioInner: 13, ratioOuter: 10 }))).toEqual([
      'edges-out-of-order',
    ]);
  });

  it('about a mirror through most of the section', () => {
    expect(cautionsOf('mirror.gradientFactor', numbers({ ROverDepth: 0.3 }))).toEqual([]);
    expect(cautionsOf('mirror.gradientFactor', numbers({ ROverDepth: 0.9 }))).toEqual(['beyond-stated-accuracy']);
  });

  it('and refuses by the names of its inputs', () => {
    const wrong = numbers({ leftRadius: 0.4, rightRadius: 0 });
    expect(evaluateMethod('mirror.averageRadius.surface', 1, wrong)).toMatchObject({ field: 'rightRadius' });
    expect(evaluateMethod('mirror.fit.origin', 1, first(1))).toMatchObject({ code: 'too-few-points', field: 'R' });
  });
});

describe('the residual stress from a mirror', () => {
  it('carries the uncertainty of mirror and load: 100 ± 5 less 140 ± 12 is −40 ± 13', () => {
    const answer = evaluateMethod('mirror.residual', 1, {
      A: { value: 2, standardUncertainty: 0.06 },
      R: { value: 0.4, standardUncertainty: 0.032 },
      appliedStress: { value: 140, standardUncertainty: 12 },
    });
    if (answer.kind !== 'value' || !answer.estimated) throw new Error('expected an estimate');
    expect(answer.estimated.value).toBeCloseTo(-40, 9);
    expect(answer.estimated.standardUncertainty).toBeCloseTo(13, 9);
  });
});
