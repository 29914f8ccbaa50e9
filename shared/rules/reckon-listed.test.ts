import { describe, expect, it } from 'vitest';
import type { Reckoning, ReckoningWanted } from '../contracts/reckonings.ts';
import { reckonListed } from './reckon-listed.ts';

const mirror: ReckoningWanted = {
  id: 'one',
  method: 'mirror.stress',
  inputs: { A: { value: 2, unit: 'MPa*sqrt(m)' }, R: { value: 0.25, unit: 'mm' } },
};
const uncertain = { u_A: { value: 0.06, unit: 'MPa*sqrt(m)' }, uR: { value: 20, unit: 'µm' } };

function outputOf(answer: Reckoning, name: string): number {
  const value = 'outputs' in answer ? answer.outputs[name]?.value : undefined;
  return typeof value === 'number' ? value : Number.NaN;
}

describe('a listed method', () => {
  it('is reckoned in whatever units its inputs have', () => {
    const inMicrons = { ...mirror, inputs: { ...mirror.inputs, R: { value: 250, unit: 'µm' } } };
    expect(outputOf(reckonListed(mirror), 'stress')).toBeCloseTo(126.491106, 5);
    expect(outputOf(reckonListed(inMicrons), 'stress')).toBeCloseTo(126.491106, 5);
  });

  it('has its uncertainty where those of its inputs stand beside them', () => {
    const answer = reckonListed({ ...mirror, inputs: { ...mirror.inputs, ...uncertain } });
    expect(outputOf(answer, 'relativeUncertainty')).toBeCloseTo(0.05, 9);
    expect(answer).toMatchObject({ outputs: { stress: { unit: 'MPa' }, c_R: { unit: 'MPa/mm' } } });
    expect(outputOf(reckonListed(mirror), 'uStress')).toBeNaN();
  });

  it('keeps its cautions', () => {
    const large = { ...mirror, inputs: { ...mirror.inputs, depth: { value: 0.5, unit: 'mm' } } };
    expect(reckonListed(large)).toMatchObject({ cautions: [{ code: 'large-mirror', weight: 'warning' }] });
  });

  it.each<[string, Partial<ReckoningWanted>, string, string]>([
    ['a method that is not there', { method: 'mirror.size' }, 'unknown-method', 'mirror.size'],
    ['an input that is not there', { inputs: { ...mirror.inputs, X: { value: 1, unit: 'mm' } } }, 'unknown-input', 'X'],
    ['an input that is missing', { inputs: { R: { value: 1, unit: 'mm' } } }, 'non-finite-input', 'A'],
    ['an empty input', { inputs: { ...mirror.inputs, R: { value: null, unit: 'mm' } } }, 'non-finite-input', 'R'],
    ['a word for a number', { inputs: { ...mirror.inputs, R: { value: 'two', unit: 'mm' } } }, 'non-finite-input', 'R'],
    ['a unit of another kind', { inputs: { ...mirror.inputs, R: { value: 1, unit: 'N' } } }, 'unknown-unit', 'R'],
    ['a unit that is none', { inputs: { ...mirror.inputs, R: { value: 1, unit: 'ell' } } }, 'unknown-unit', 'R'],
  ])('is refused for %s', (_what, wrong, refused, field) => {
    expect(reckonListed({ ...mirror, ...wrong })).toEqual({ id: 'one', refused, field });
  });
});

describe('a listed Monte Carlo', () => {
  const drawn = (more: ReckoningWanted['inputs'] = {}, method = 'montecarlo.mirror.stress') =>
    reckonListed({ id: 'one', method, inputs: { ...mirror.inputs, ...uncertain, ...more } });

  it('draws any method of the table, the same digits each time', () => {
    const fewer = { draws: { value: 20_000, unit: '1' }, seed: { value: 3, unit: '1' } };
    expect(drawn(fewer)).toEqual(drawn(fewer));
    // first order gives 5 % of 126.5; the curve of the root adds little
    expect(outputOf(drawn(fewer), 'standardDeviation')).toBeCloseTo(6.4, 0);
    expect(outputOf(drawn(fewer), 'symmetricLow')).toBeLessThan(outputOf(drawn(fewer), 'mean'));
  });

  it.each<[string, ReckoningWanted['inputs'], string, string]>([
    ['a spread it does not know', { distributions: { value: 'round', unit: 'code' } }, 'not-a-choice', 'distributions'],
    ['too many draws', { draws: { value: 1e7, unit: '1' } }, 'outside-validity-range', 'draws'],
    ['half a draw', { draws: { value: 10.5, unit: '1' } }, 'too-few-points', 'draws'],
    ['a seed below 0', { seed: { value: -1, unit: '1' } }, 'outside-validity-range', 'seed'],
    ['what its method refuses', { R: { value: 0, unit: 'mm' } }, 'non-positive-mirror-radius', 'R'],
  ])('is refused for %s', (_what, inputs, refused, field) => {
    expect(drawn(inputs)).toEqual({ id: 'one', refused, field });
  });

  it('is refused for a method that gives only words', () => {
    const words = { code: { value: 'P^V', unit: 'code' } };
    const answer = reckonListed({ id: 'one', method: 'montecarlo.originCode.parse', inputs: words });
    expect(answer).toMatchObject({ refused: 'unknown-method' });
  });
});
