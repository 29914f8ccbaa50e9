import { describe, expect, it } from 'vitest';
import { barInputs } from '../numeric/methods/bar-inputs.ts';
import { readTypedInput } from './read-typed-input.ts';

const typed = (
  text: string,
  uncertaintyText: string,
  uncertaintyAs: Parameters<typeof readTypedInput>[1]['uncertaintyAs'] = 'standard',
) => readTypedInput(barInputs.depth, { text, uncertaintyText, uncertaintyAs });

describe('a typed input', () => {
  it('takes a bare ± in the unit the value was typed in', () => {
    expect(typed('0.118 in', '0.001')).toMatchObject({ kind: 'read', standardUncertainty: 0.0254 });
    expect(typed('3 mm', '10 µm')).toMatchObject({ standardUncertainty: 0.01 });
  });

  it('takes a ± in per cent as a part of the value', () => {
    expect(typed('4 mm', '2 %')).toMatchObject({ standardUncertainty: 0.08, distribution: 'normal' });
  });

  it('halves U at k = 2, and divides a half-width by √3 or √6', () => {
    expect(typed('3 mm', '0.02', 'expanded')).toMatchObject({ standardUncertainty: 0.01 });
    expect(typed('3 mm', '0.3', 'rectangular')).toMatchObject({
      standardUncertainty: 0.3 / Math.sqrt(3),
      distribution: 'rectangular',
    });
    expect(typed('3 mm', '0.3', 'triangular')).toMatchObject({ standardUncertainty: 0.3 / Math.sqrt(6) });
  });

  it('says which of the two typings is wrong, and in whose field', () => {
    expect(typed('3', '0.01')).toMatchObject({ kind: 'refused', part: 'value' });
    expect(typed('3 mm', '1 N')).toMatchObject({ kind: 'refused', part: 'uncertainty' });
    expect(typed('3 mm', '-0.1')).toMatchObject({ part: 'uncertainty', reason: '± of Depth must be 0 or more.' });
  });

  it('leaves the ± open where none was typed, and 0 where it is exact', () => {
    expect(typed('3 mm', ' ')).toMatchObject({ kind: 'read', standardUncertainty: undefined });
    expect(typed('3 mm', '0')).toMatchObject({ kind: 'read', standardUncertainty: 0 });
  });
});
