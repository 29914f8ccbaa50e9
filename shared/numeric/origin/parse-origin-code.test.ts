import { describe, expect, it } from 'vitest';
import { parseOriginCode } from './parse-origin-code.ts';

describe('the code of an origin', () => {
  it.each([
    ['P^V', 'single', ['P^V'], []],
    ['I_Fe', 'single', ['I_Fe'], []],
    ['MD', 'single', ['MD'], []],
    ['?', 'single', ['?'], []],
    ['–', 'single', ['–'], []],
    ['P^V?', 'uncertain', ['P^V'], ['P^V']],
    ['P^V & LG^V', 'primary-secondary', ['P^V', 'LG^V'], []],
    ['A^V/P^V', 'either', ['A^V', 'P^V'], []],
    ['P^V+MD^S?', 'linked', ['P^V', 'MD^S'], ['MD^S']],
    ['A^V/P^V/I_W^V', 'either', ['A^V', 'P^V', 'I_W^V'], []],
  ])('%s is %s', (code, relation, parts, uncertainParts) => {
    expect(parseOriginCode(code)).toEqual({ relation, parts, uncertainParts });
  });

  it.each(['', 'P^V&LG^V/A^V', 'P^V&', '&P^V', 'P^X', 'P^', 'P_', 'P^V??', '?^V', '12', 'P V', 'P^V&?', 'P^V^S'])(
    'is refused for “%s”',
    (code) => {
      expect(() => parseOriginCode(code)).toThrow(expect.objectContaining({ code: 'unreadable-code', field: 'code' }));
    },
  );
});
