import { createHash, randomBytes } from 'node:crypto';
import type { Transaction } from '../../../database/connection.ts';
import { Problem } from '../../../http/problem.ts';
import { lockPerson, type PersonRow } from '../queries.ts';
import { findLinkOwner, insertLink, spendLink, type LinkPurpose } from '../queries/one-time-links.ts';

const hour = 3_600_000;

/** How long a link of each purpose holds, in milliseconds. */
const holdsMs: Record<LinkPurpose, number> = { invitation: 7 * 24 * hour, password: hour };

const placeOf: Record<LinkPurpose, string> = { invitation: '/invitation', password: '/password' };

/** Makes a link that works once; only the hash of its token is kept here. @returns its path below the own address */
export async function makeLink(
  tx: Transaction,
  link: { purpose: LinkPurpose; personId: string; madeBy: string | null },
): Promise<string> {
  const token = randomBytes(32).toString('base64url');
  await insertLink(tx, {
    ...link,
    tokenHash: hashOfToken(token),
    madeAt: tx.at,
    endsAt: new Date(tx.at.getTime() + holdsMs[link.purpose]),
  });
  return `${placeOf[link.purpose]}/${token}`;
}

export function hashOfToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}

/** The same answer for a link never made, used, taken back or run out. */
export function linkSpent(): Problem {
  return new Problem('link-spent', 'This link no longer works: it was used, taken back, or its time has run out.');
}

/**
 * Spends a link for its owner, whose account must stand in that state; of two at once one gets the account, the other
 * is told that the link no longer works.
 */
export async function spendForOwner(
  tx: Transaction,
  link: { token: string; purpose: LinkPurpose; state: PersonRow['state'] },
): Promise<PersonRow> {
  const kept = { tokenHash: hashOfToken(link.token), purpose: link.purpose };
  const ownerId = await findLinkOwner(tx, { ...kept, at: tx.at });
  // The account is locked before its link, as everywhere, so that two acts on it never wait for each other.
  const row = ownerId ? await lockPerson(tx, ownerId) : null;
  if (row?.state !== link.state || !(await spendLink(tx, kept))) throw linkSpent();
  return row;
}
