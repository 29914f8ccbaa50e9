import { describe, expect, it } from 'vitest';
import { caseStates, type CaseState } from '../vocabulary/case-states.ts';
import { canBeHeld, findMove, movesByHand } from './case-transitions.ts';

// From product.md's sentence of moves, written out once more by hand.
const legal: readonly (readonly [CaseState, CaseState])[] = [
  ['received', 'examining'],
  ['examining', 'drafting'],
  ['drafting', 'in review'],
  ['in review', 'closed'],
  ['in review', 'drafting'],
  ['drafting', 'examining'],
  ['received', 'withdrawn'],
  ['examining', 'withdrawn'],
  ['drafting', 'withdrawn'],
  ['in review', 'withdrawn'],
];
const pairs = caseStates.flatMap((from) => caseStates.map((to) => [from, to] as const));
const isLegal = ([from, to]: readonly [CaseState, CaseState]) => legal.some(([a, b]) => a === from && b === to);

describe('the path of a case', () => {
  it.each(pairs.filter(isLegal))('leads from %s to %s', (from, to) => {
    expect(findMove(from, to)).toBeDefined();
  });

  it.each(pairs.filter((pair) => !isLegal(pair)))('does not lead from %s to %s', (from, to) => {
    expect(findMove(from, to)).toBeUndefined();
  });

  it('is closed and withdrawn for good', () => {
    expect(caseStates.filter((to) => findMove('closed', to) ?? findMove('withdrawn', to))).toEqual([]);
  });

  it('asks for a reason to send back and to withdraw', () => {
    expect(findMove('in review', 'drafting')?.needsReason).toBe(true);
    expect(findMove('received', 'withdrawn')?.needsReason).toBe(true);
  });

  it('leaves review, closing and withdrawal to places of their own', () => {
    expect(movesByHand('drafting').map((move) => move.to)).toEqual(['examining']);
    expect(movesByHand('in review')).toEqual([]);
  });

  it('may be held anywhere but at an end', () => {
    expect(caseStates.filter(canBeHeld)).toEqual(['received', 'examining', 'drafting', 'in review']);
  });
});
