import type { HistoryPage } from '#shared/contracts/cases.ts';
import type { Reader } from '../../../database/connection.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import { listEntries } from '../queries/history.ts';
import { presentEntry } from '../present.ts';

const entriesAPage = 20;

/** A page of the case's trail, newest first: who did what, when and why. */
export async function listHistory(reader: Reader, heldCase: HeldFor<'read'>, before?: number): Promise<HistoryPage> {
  // One more than is shown tells whether there are earlier ones.
  const rows = await listEntries(reader, heldCase.id, { before, limit: entriesAPage + 1 });
  return { entries: rows.slice(0, entriesAPage).map(presentEntry), hasEarlier: rows.length > entriesAPage };
}
