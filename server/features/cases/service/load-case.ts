import type { CaseAnswer } from '#shared/contracts/cases.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import type { CaseRow } from '../../../rights/queries.ts';
import { may } from '#shared/rules/may.ts';
import { factsOf } from '../../../rights/open-case.ts';
import { loadCaseNames, listNamedPeople } from '../queries/cases.ts';
import { presentCase, presentFollowedCase } from '../present.ts';

/** The case as this person sees it: whole for the laboratory's staff, the state in plain words for who follows it. */
export function loadCase(context: Context, heldCase: HeldFor<'follow'>): Promise<CaseAnswer> {
  if (!may(context.person, 'read', factsOf(heldCase)).allowed) return Promise.resolve(presentFollowedCase(heldCase));
  return context.inTransaction((tx) => presentWhole(tx, heldCase));
}

/** The whole of a case as it stands in this transaction, for staff. */
export async function presentWhole(tx: Transaction, row: CaseRow): Promise<CaseAnswer> {
  const names = await loadCaseNames(tx, row.id);
  return presentCase(row, names, { namedPeople: await listNamedPeople(tx, row.id), asOf: tx.at });
}
