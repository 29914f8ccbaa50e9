import { describe, expect, it } from 'vitest';
import type { PieceView } from '#shared/contracts/evidence.ts';
import { depthOf, remarkOf, shapeOf } from './piece-words.ts';

const piece: PieceView = {
  id: 'f1',
  partId: 'p1',
  parentId: null,
  code: 'F1',
  description: 'foot, flange',
  way: 'break',
  status: 'present',
  missingReason: null,
  originLies: null,
  mass: null,
  place: 'safe S2',
  holder: 'Ana Lyst',
  condition: 'edge chipped in transport',
  receivedOn: null,
  madeAt: '2026-06-22T08:00:00.000Z',
  version: 1,
};

describe('a piece in the list', () => {
  it('is drawn dashed when it is not there, and doubled when it is a replica', () => {
    expect(shapeOf(piece)).toBe('fragment');
    expect(shapeOf({ ...piece, status: 'missing' })).toBe('missing');
    expect(shapeOf({ ...piece, way: 'replica' })).toBe('replica');
  });

  it('stands below what it was made from', () => {
    const replica = { ...piece, id: 'r1', parentId: 'f1' };
    expect([depthOf(piece, [piece, replica]), depthOf(replica, [piece, replica])]).toEqual([1, 2]);
  });

  it('says in the margin what its absence means before anything else', () => {
    expect(remarkOf(piece)?.words).toBe('edge chipped in transport');
    const missing = { ...piece, status: 'missing', originLies: 'not known' } as const;
    expect(remarkOf(missing)).toEqual({ words: 'origin: not known', tone: 'ochre' });
    expect(remarkOf({ ...missing, originLies: 'yes' })?.tone).toBe('iron');
  });
});
