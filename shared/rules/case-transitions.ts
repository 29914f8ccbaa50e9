import type { CaseState } from '../vocabulary/case-states.ts';
import type { CaseAct } from './may.ts';

export type CaseMove = {
  readonly from: CaseState;
  readonly to: CaseState;
  /** The act whose right the move needs. */
  readonly act: CaseAct;
  /** Verb and object, for a button. */
  readonly words: string;
  readonly needsReason: boolean;
};

/** Every move of a case. What is not here does not happen; holding a case stands beside its state and moves nothing. */
export const caseMoves = [
  { from: 'received', to: 'examining', act: 'move', words: 'Start examining', needsReason: false },
  { from: 'examining', to: 'drafting', act: 'move', words: 'Start drafting', needsReason: false },
  { from: 'drafting', to: 'examining', act: 'move', words: 'Go back to examining', needsReason: false },
  { from: 'drafting', to: 'in review', act: 'send to review', words: 'Send to review', needsReason: false },
  { from: 'in review', to: 'drafting', act: 'send back', words: 'Send back to drafting', needsReason: true },
  { from: 'in review', to: 'closed', act: 'sign as approved', words: 'Sign and close', needsReason: false },
  { from: 'received', to: 'withdrawn', act: 'withdraw', words: 'Withdraw the case', needsReason: true },
  { from: 'examining', to: 'withdrawn', act: 'withdraw', words: 'Withdraw the case', needsReason: true },
  { from: 'drafting', to: 'withdrawn', act: 'withdraw', words: 'Withdraw the case', needsReason: true },
  { from: 'in review', to: 'withdrawn', act: 'withdraw', words: 'Withdraw the case', needsReason: true },
] as const satisfies readonly CaseMove[];

/** The move between two states, if there is one. */
export function findMove(from: CaseState, to: CaseState): CaseMove | undefined {
  return caseMoves.find((move) => move.from === from && move.to === to);
}

/** The moves an analyst makes by hand; review, sending back, closing and withdrawal have places of their own. */
export function movesByHand(from: CaseState): readonly CaseMove[] {
  return caseMoves.filter((move) => move.from === from && move.act === 'move');
}

/** A case is put on hold, and taken off it, wherever it stands but at an end. */
export function canBeHeld(state: CaseState): boolean {
  return state !== 'closed' && state !== 'withdrawn';
}
