import { describe, expect, it } from 'vitest';
import { changesBetween } from './changes-between.ts';

describe('the two sides of an act', () => {
  it('show only the fields that differ, in words', () => {
    const before = { name: 'Ana', roles: ['analyst'], roomyRows: false };
    const after = { name: 'Ana', roles: ['analyst', 'manager'], roomyRows: true };
    expect(changesBetween(before, after)).toEqual([
      { field: 'roles', before: 'analyst', after: 'analyst, manager' },
      { field: 'roomy rows', before: 'no', after: 'yes' },
    ]);
  });

  it('show everything of what is new, and nothing where nothing was said', () => {
    expect(changesBetween(null, { name: 'Ana' })).toEqual([{ field: 'name', before: '', after: 'Ana' }]);
    expect(changesBetween(null, null)).toEqual([]);
  });
});
