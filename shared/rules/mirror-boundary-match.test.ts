import { describe, expect, it } from 'vitest';
import { boundaryMismatch } from './mirror-boundary-match.ts';

describe('a mirror radius and a mirror constant', () => {
  it('go together when both are of one boundary', () => {
    expect(boundaryMismatch('inner', 'inner')).toBeNull();
    expect(boundaryMismatch('branching', 'branching')).toBeNull();
  });

  it('do not when they are of two, and both are named', () => {
    const words = boundaryMismatch('inner', 'outer');
    expect(words).toContain('the inner boundary, mirror to mist');
    expect(words).toContain('the outer boundary, mist to hackle');
  });

  it('do not when either does not say which, nor when neither does', () => {
    expect(boundaryMismatch('not stated', 'outer')).toContain('Mirror radius does not say');
    expect(boundaryMismatch('outer', 'not stated')).toContain('Mirror constant does not say');
    expect(boundaryMismatch('not stated', 'not stated')).not.toBeNull();
  });
});
