import { describe, expect, it } from 'vitest';
import { compareWithPart, contentHashOf, rootHashOf, sealPart, type Manifest } from './manifest.ts';

const row = (id: string, hash: string) => ({ id, hash });
const marks = { table: 'marks', columns: ['id', 'number'], rows: [row('m1', 'a'), row('m2', 'b')] };
const part = sealPart({ key: 'marks', chapter: '', name: 'Marks', holding: '2 marks', tables: [marks], files: [] });
const manifest: Manifest = {
  format: 1,
  number: 'HB-2026-0001',
  closedAt: '2026-06-24T10:04:00.000Z',
  parts: [part],
  previousRootHash: '',
};

describe('the list of what is sealed', () => {
  it('matches while every row is as it was', () => {
    expect(compareWithPart(part, [marks])).toEqual([]);
  });

  it('names the row that was changed, taken away or put in', () => {
    const now = { ...marks, rows: [row('m1', 'other'), row('m3', 'c')] };
    expect(compareWithPart(part, [now])).toEqual([
      { words: 'marks m1', outcome: 'changed' },
      { words: 'marks m2', outcome: 'missing' },
      { words: 'marks m3', outcome: 'added' },
    ]);
  });

  it('names the list itself when it was changed to fit the rows', () => {
    const forged = { ...part, tables: [{ ...marks, rows: [row('m1', 'other'), row('m2', 'b')] }] };
    expect(compareWithPart(forged, forged.tables)).toEqual([{ words: 'the list itself', outcome: 'changed' }]);
  });

  it('has another root for another part, another closing and another closure before it', () => {
    const roots = [
      manifest,
      { ...manifest, parts: [{ ...part, hash: 'other' }] },
      { ...manifest, closedAt: '2026-06-25T10:04:00.000Z' },
      { ...manifest, previousRootHash: 'earlier' },
    ].map(rootHashOf);
    expect(new Set(roots).size).toBe(4);
  });

  it('has the same hash of content whoever signs it, and another in another case', () => {
    expect(contentHashOf('HB-2026-0001', [part])).toBe(contentHashOf('HB-2026-0001', [{ ...part, holding: 'two' }]));
    expect(contentHashOf('HB-2026-0002', [part])).not.toBe(contentHashOf('HB-2026-0001', [part]));
  });
});
