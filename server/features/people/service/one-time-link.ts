import { createHash, randomBytes } from 'node:crypto';
import type { Transaction } from '../../../database/connection.ts';
import { Problem } from '../../../http/problem.ts';
import { insertLink, type LinkPurpose } from '../queries/one-time-links.ts';

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
