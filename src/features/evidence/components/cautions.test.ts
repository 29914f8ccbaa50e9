import { describe, expect, it } from 'vitest';
import type { PartView } from '#shared/contracts/evidence.ts';
import { cautionsFor } from './cautions.ts';

const part: PartView = {
  id: 'p1',
  description: 'Bar',
  serial: null,
  drawing: null,
  maker: null,
  material: null,
  environment: null,
  temperatureC: null,
  serviceTime: null,
  version: 1,
};
const leads = (...parts: PartView[]) => cautionsFor(parts).map((caution) => caution.lead);
const material = (family: 'glass, tempered' | 'hardmetal') => ({ id: 'm', name: 'invented', family });

describe('the cautions beside the pieces', () => {
  it('always begin with sharp edges and with asking what it is', () => {
    expect(leads()).toHaveLength(2);
    expect(leads(part)).toEqual(leads());
  });
  it('tell of stored energy for tempered glass, and of cobalt dust for hardmetal', () => {
    expect(leads({ ...part, material: material('glass, tempered') })).toContain(
      'Tempered, cracked or bent glass stores energy',
    );
    expect(leads({ ...part, material: material('hardmetal') })[2]).toContain('Cobalt-bearing dust');
  });
  it('tell of infection for an oral part, and of live equipment for an insulator', () => {
    expect(leads({ ...part, environment: 'oral, 37 °C' })[2]).toContain('infectious');
    expect(leads({ ...part, description: 'Post insulator' })[2]).toContain('live or charged');
  });
});
