import { describe, expect, it } from 'vitest';
import { readConstant } from './read-constant.ts';

const toughness = { kind: 'toughness', value: '3.5 MPa m½', plusMinus: '0.2', plusMinusIs: 'U' } as const;

describe('a constant as typed', () => {
  it('keeps U at k = 2 as half of it, standard', () => {
    expect(readConstant(toughness)).toMatchObject({ value: 3.5, standardUncertainty: 0.1, enteredUnit: 'MPa m½' });
    expect(readConstant({ ...toughness, plusMinusIs: 'u' })).toMatchObject({ standardUncertainty: 0.2 });
  });

  it('turns another unit into ours and takes ± in the same', () => {
    // 1 ksi√in = 6.894757 MPa × √0.0254 m = 1.098844 MPa√m
    const read = readConstant({ ...toughness, value: '3 ksi√in', plusMinus: '0.2' });
    expect(read).toMatchObject({ kind: 'read', value: expect.closeTo(3.29653, 4) });
    expect(read).toMatchObject({ standardUncertainty: expect.closeTo(0.109884, 5) });
  });

  it('keeps an elastic modulus in GPa', () => {
    const typed = { kind: 'elastic modulus', value: '372 GPa', plusMinus: '7000 MPa', plusMinusIs: 'U' } as const;
    expect(readConstant(typed)).toMatchObject({ value: 372, standardUncertainty: 3.5 });
  });

  it('is refused without a unit, with a unit of something else, or without ±', () => {
    expect(readConstant({ ...toughness, value: '3.5' })).toMatchObject({ kind: 'refused', field: 'value' });
    expect(readConstant({ ...toughness, value: '3.5 MPa' })).toMatchObject({ kind: 'refused', field: 'value' });
    expect(readConstant({ ...toughness, plusMinus: '0' })).toMatchObject({ kind: 'refused', field: 'plusMinus' });
  });

  it("is refused where no solid has it: a Poisson's ratio of a half, a toughness of nothing", () => {
    const poisson = { kind: 'Poisson ratio', value: '0.5', plusMinus: '0.01', plusMinusIs: 'U' } as const;
    expect(readConstant(poisson)).toMatchObject({ kind: 'refused', field: 'value' });
    expect(readConstant({ ...poisson, value: '0.23' })).toMatchObject({ kind: 'read', value: 0.23 });
    expect(readConstant({ ...toughness, value: '0 MPa m½' })).toMatchObject({ field: 'value' });
  });
});
