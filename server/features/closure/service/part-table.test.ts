import { describe, expect, it } from 'vitest';
import { sealedTables } from '../../../database/sealed-tables.ts';
import { contentParts, trailPart } from './part-table.ts';

describe('the list of what is sealed', () => {
  it('takes in every table that a seal rests on, but the closures themselves', () => {
    const listed = new Set<string>([...contentParts, trailPart].flatMap((part) => part.tables));
    expect(sealedTables.filter((table) => !listed.has(table))).toEqual(['closures']);
  });
});
