import type { Reader } from '../database/connection.ts';
import { findLastMails } from './queries.ts';

/** What became of the last mail with that subject to each address, by address in small letters. */
export async function lastMails(reader: Reader, subject: string, addresses: readonly string[]) {
  const rows = await findLastMails(reader, subject, addresses);
  return new Map([...rows].map(([address, { state, fault }]) => [address, { state, fault }]));
}
