import type { CaseNumber } from '#shared/contracts/ids.ts';
import { may, seesCase, type CaseAct, type CaseFacts } from '#shared/rules/may.ts';
import type { Person } from '#shared/contracts/people.ts';
import type { Reader, Transaction } from '../database/connection.ts';
import type { Context } from '../http/context.ts';
import { Problem } from '../http/problem.ts';
import { findCaseRow, lockCaseRow, type CaseRow } from './queries.ts';

declare const heldFor: unique symbol;

/** A case opened for one act by someone who may do it. Only this file makes one; services and case queries demand it. */
export type HeldFor<Act extends CaseAct> = CaseRow & { readonly [heldFor]: Act };

/**
 * Opens a case for an act: the proof of who asks that every query of a case demands.
 * @throws Problem not-found for outsiders and for what is not there, in the same words; not-allowed with the reason
 * for a colleague; closed-case or wrong-state where only the case's state stands in the way.
 */
export async function openCase<Act extends CaseAct>(
  context: Context,
  number: CaseNumber,
  act: Act,
): Promise<HeldFor<Act>> {
  const row = await findCaseRow(context.reader, number);
  return held(context.person, act, row);
}

/** Locks the case row and asks again inside the transaction, so that an act on a case closed meanwhile is refused. */
export async function lockCase<Act extends CaseAct>(
  tx: Transaction,
  context: Context,
  heldCase: HeldFor<Act>,
  act: Act,
): Promise<HeldFor<Act>> {
  const row = await lockCaseRow(tx, heldCase.id);
  return held(context.person, act, row);
}

/** A case as it stands after a change in this transaction; the right to the change was proven before it. */
export async function rereadCase(tx: Transaction, changed: CaseRow): Promise<CaseRow> {
  return (await lockCaseRow(tx, changed.id)) ?? changed;
}

/** Whether the person sees a case at all, by its id: the wall for records reached by their own id. */
export async function findSeenCase(reader: Reader, person: Person, number: CaseNumber): Promise<CaseRow | null> {
  const row = await findCaseRow(reader, number);
  return row && seesCase(person, factsOf(row)) ? row : null;
}

function held<Act extends CaseAct>(person: Person, act: Act, row: CaseRow | null): HeldFor<Act> {
  const facts = row ? factsOf(row) : null;
  if (!row || !facts || !seesCase(person, facts)) throw nothingHere();
  const answer = may(person, act, facts);
  if (!answer.allowed) throw refusalOf(person, act, facts, answer.reason);
  return row as HeldFor<Act>; // brand: the check has just been made
}

/** The state stands in the way only when the same person might do the act in a case that is being worked on. */
function refusalOf(person: Person, act: CaseAct, facts: CaseFacts, reason: string): Problem {
  const elsewhere = (['drafting', 'in review', 'received'] as const).some(
    (state) => may(person, act, { ...facts, state, onHold: false }).allowed,
  );
  if (!elsewhere) return new Problem('not-allowed', reason);
  return facts.state === 'closed'
    ? new Problem('closed-case', 'This case is closed and sealed; it changes only by amendment.', {
        stillHolds: 'Nothing in the case was changed.',
      })
    : new Problem('wrong-state', reason);
}

/** One wording for what is not there and for what one may not see. */
export function nothingHere(): Problem {
  return new Problem('not-found', 'Nothing here under this number.');
}

export function factsOf(row: CaseRow): CaseFacts {
  return {
    state: row.state,
    onHold: row.holdReason !== null,
    organisationId: row.organisationId,
    restricted: row.restricted,
    namedPersonIds: row.namedPersonIds,
    assignedTo: row.assignedTo,
    authorIds: row.authorIds,
  };
}
