import { passwordFault } from '#shared/rules/password-fault.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { VisitorContext } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { presentLink, presentPerson } from '../present.ts';
import { findPersonById, noteVisit, updatePerson, type PersonRow } from '../queries.ts';
import { findLinkOwner, type LinkPurpose } from '../queries/one-time-links.ts';
import { hashOfToken, linkSpent, spendForOwner } from './one-time-link.ts';
import { hashPassword } from './password.ts';

/** Whom a link is for. @throws Problem link-spent, the same whatever ended it */
export async function findLinkFor(context: VisitorContext, link: { token: string; purpose: LinkPurpose }) {
  return presentLink(await loadOwner(context, link));
}

/** Accepts an invitation: the account opens with the password chosen. Of two at once one wins. */
export async function acceptInvitation(context: VisitorContext, token: string, password: string) {
  const passwordHash = await hashChosen(context, { token, purpose: 'invitation' }, password);
  return context.inTransaction(async (tx) => {
    const row = await spendForOwner(tx, { token, purpose: 'invitation', state: 'invited' });
    await updatePerson(tx, row, { passwordHash, state: 'open' });
    await noteVisit(tx, row.id, tx.at);
    await recordAct(tx, row, { act: 'invitation.accepted', objectId: row.id });
    return presentPerson(row);
  });
}

/** The hash of a password chosen over a link, once it has been found good for the link's owner. */
export async function hashChosen(
  context: VisitorContext,
  link: { token: string; purpose: LinkPurpose },
  password: string,
): Promise<string> {
  const owner = await loadOwner(context, link);
  checkPassword(password, owner);
  return hashPassword(password);
}

/** @throws Problem not-valid with the sentence of the rule */
export function checkPassword(password: string, owner: { name: string; mail: string }): void {
  const fault = passwordFault(password, owner);
  if (fault) throw new Problem('not-valid', fault, { field: 'password' });
}

function loadOwner(context: VisitorContext, link: { token: string; purpose: LinkPurpose }): Promise<PersonRow> {
  return context.inTransaction(async (tx) => {
    const { purpose } = link;
    const personId = await findLinkOwner(tx, { tokenHash: hashOfToken(link.token), purpose, at: tx.at });
    const row = personId ? await findPersonById(tx, personId) : null;
    if (row?.state !== (purpose === 'invitation' ? 'invited' : 'open')) throw linkSpent();
    return row;
  });
}
