import { describe, expect, it } from 'vitest';
import { hashOfContent } from './canonical-hash.ts';

describe('the hash of content', () => {
  it('is that of the canonical form, not of the order in which fields were written', () => {
    expect(hashOfContent({ b: 1, a: [2, { d: 'x', c: null }] })).toBe(
      hashOfContent({ a: [2, { c: null, d: 'x' }], b: 1 }),
    );
  });

  it('is the SHA-256 of the bytes of RFC 8785', () => {
    // printf '{"a":1}' | sha256sum
    expect(hashOfContent({ a: 1.0 })).toBe('015abd7f5cc57a2dd94b7590f04ad8084273905ee33ec5cebeae62276a97f862');
  });

  it('changes with any digit', () => {
    expect(hashOfContent({ stressMPa: 343.3333333333333 })).not.toBe(hashOfContent({ stressMPa: 343.33333333333337 }));
  });

  it('refuses what is no content at all', () => {
    expect(() => hashOfContent(undefined)).toThrow('only JSON content');
  });
});
