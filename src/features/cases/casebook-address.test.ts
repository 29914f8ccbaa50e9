import { describe, expect, it } from 'vitest';
import { readAddress, writeAddress } from './casebook-address.ts';

describe('the address of the Casebook', () => {
  it('keeps the filters, and only what differs from how it opens', () => {
    expect(writeAddress({ state: 'on hold', held: 'me', page: 1, year: 'this' })).toBe('state=on+hold&held=me');
    expect(writeAddress({})).toBe('');
  });

  it('reads back as it was written', () => {
    const query = { ...readAddress(new URLSearchParams()), state: 'in review', stale: '1', page: 3 } as const;
    expect(readAddress(new URLSearchParams(writeAddress(query)))).toEqual(query);
  });

  it('passes over what it cannot read', () => {
    const query = readAddress(new URLSearchParams('state=lost&find=1&origin=P&page=0'));
    expect(query).toMatchObject({ state: 'any', origin: 'P', page: 1 });
  });
});
