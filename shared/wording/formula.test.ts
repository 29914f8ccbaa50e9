import { describe, expect, it } from 'vitest';
import { findCurrentMethod } from '../numeric/methods.ts';
import type { GivenInputs } from '../numeric/methods/method.ts';
import { formulaWithNumbers, type FormulaNumbers } from './formula.ts';

function rendered(id: string, inputs: Record<string, number>, rest: Omit<FormulaNumbers, 'given'> = {}): string {
  const method = findCurrentMethod(id);
  if (!method) throw new Error(`No method ${id}`);
  const given: GivenInputs = Object.fromEntries(Object.entries(inputs).map(([name, value]) => [name, { value }]));
  return formulaWithNumbers(method, { given, ...rest }).replaceAll('\u00A0', ' ');
}

const bar = { load: 421, outerSpan: 40, innerSpan: 20, width: 4.01, depth: 3 };

describe('a formula with its numbers', () => {
  it('reads like the sum written out by hand, digits as typed', () => {
    expect(rendered('bend4.rect', bar, { typed: { depth: '3.00' }, result: '350.0 MPa' })).toBe(
      '3 × 421 N × (40 − 20) mm / (2 × 4.01 mm × (3.00 mm)²) = 350.0 MPa',
    );
  });

  it('shows the metre under a root', () => {
    expect(rendered('mirror.stress', { A: 8.5, R: 0.56 })).toBe('8.5 MPa m½ / √(0.00056 m)');
    expect(rendered('flaw.stress', { KIc: 3.5, Y: 1.29, c: 0.064 })).toBe('3.5 MPa m½ / (1.29 × √(0.000064 m))');
  });

  it('takes the arm that holds where the origin lies', () => {
    expect(rendered('bend4.rect.local', { ...bar, x: 4, y: 0.3 })).toContain('(40 − 20) mm');
    expect(rendered('bend4.rect.local', { ...bar, x: -13, y: 0.3 })).toContain('(40 − 2 × |−13|) mm');
  });

  it.each(['bend3.rect', 'bend3.rect.local', 'bend4.rect', 'bend4.rect.local', 'mirror.stress', 'flaw.stress'])(
    'leaves no blank in %s',
    (id) => {
      const inputs = { ...bar, x: 1, y: 0.1, A: 2, R: 0.2, KIc: 3, Y: 1.3, c: 0.1 };
      expect(rendered(id, inputs)).not.toMatch(/[{}]|NaN/);
    },
  );
});
