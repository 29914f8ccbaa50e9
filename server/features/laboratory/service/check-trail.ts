import type { TrailCheck } from '#shared/contracts/laboratory.ts';
import { hashOfEntry } from '../../../audit/record-act.ts';
import type { Reader } from '../../../database/connection.ts';
import { wordsOfAct } from '../present.ts';
import { listChained, type AuditRow } from '../queries.ts';

const entriesAtOnce = 500;

/**
 * Recomputes the hash of every entry, chain by chain, and names in each broken chain the first entry that does not
 * match: one that was altered, or one before which an entry is missing. What was cut off a chain's end leaves no trace
 * here; a closure's seal shows that.
 */
export async function checkTrail({ reader }: { reader: Reader }): Promise<TrailCheck> {
  const found: TrailCheck = { chains: 0, entries: 0, broken: [] };
  let last: Linked | null = null;
  for (;;) {
    const rows: ChainedRow[] = await listChained(reader, last, entriesAtOnce);
    for (const row of rows) last = follow(found, row, last);
    if (rows.length < entriesAtOnce) return found;
  }
}

type ChainedRow = Awaited<ReturnType<typeof listChained>>[number];
type Linked = { chain: string; id: number; hash: string; isBroken: boolean };

/** Counts one entry, and notes its fault if it is the first of its chain. */
function follow(found: TrailCheck, { entry, caseNumber }: ChainedRow, last: Linked | null): Linked {
  const before = last?.chain === entry.chain ? last : null;
  if (!before) found.chains += 1;
  found.entries += 1;
  const { id, at, act, personName, chain, hash } = entry;
  const fault = before?.isBroken ? null : faultOfEntry(entry, before?.hash ?? '');
  if (fault) {
    const words = wordsOfAct(act);
    found.broken.push({ caseNumber, entryId: id, at: at.toISOString(), words, personName, fault });
  }
  return { chain, id, hash, isBroken: before?.isBroken === true || fault !== null };
}

function faultOfEntry(entry: AuditRow, previousHash: string): TrailCheck['broken'][number]['fault'] | null {
  const { id: _id, hash, ...hashed } = entry;
  if (hashOfEntry(hashed) !== hash) return 'altered';
  return entry.previousHash === previousHash ? null : 'entry missing before it';
}
