import type { MarkVersionView } from '#shared/contracts/marks.ts';
import { recordAct, type Json } from '../../../audit/record-act.ts';
import type { ActName } from '../../../audit/act-table.ts';
import type { Context } from '../../../http/context.ts';
import type { Transaction } from '../../../database/connection.ts';
import { markDependentsStale } from '../../../lineage/lineage.ts';
import { insertVersion, type HeldCase, type MarkRow } from '../queries.ts';

export type MarkSeen = Pick<MarkVersionView, 'geometry' | 'certainty' | 'boundary' | 'originCode' | 'note' | 'removed'>;

export type NextVersion = {
  readonly act: Extract<ActName, `mark.${string}`>;
  /** What was done, for the margin: "was moved". */
  readonly words: string;
  readonly seen: MarkSeen;
  /** Whether anything read from the mark holds no longer. Certainty and a note change no reading. */
  readonly changesReadings: boolean;
};

/** Adds the version that follows a mark as it stands, and says so to all that was read from the former one. */
export async function followMark(
  tx: Transaction,
  context: Context,
  heldCase: HeldCase,
  row: MarkRow,
  next: NextVersion,
): Promise<void> {
  const version = await insertVersion(tx, {
    ...next.seen,
    caseId: heldCase.id,
    markId: row.id,
    version: row.version + 1,
    supersedesId: row.versionId,
    madeBy: context.person.id,
    madeAt: tx.at,
  });
  if (next.changesReadings) {
    await markDependentsStale(tx, {
      kind: 'mark version',
      oldId: row.versionId,
      ...(next.seen.removed ? {} : { newId: version.id }),
      why: `mark m${row.number} ${next.words} by ${context.person.name}`,
    });
  }
  await recordAct(tx, context.person, {
    act: next.act,
    inCase: heldCase,
    objectId: row.id,
    before: { mark: `m${row.number}`, ...asJson(seenOf(row)) },
    after: { mark: `m${row.number}`, ...asJson(next.seen) },
  });
}

/** What a version says of the mark, without who made it and when. */
export function seenOf(row: MarkRow): MarkSeen {
  const { geometry, certainty, boundary, originCode, note, removed } = row;
  return { geometry, certainty, boundary, originCode, note, removed };
}

function asJson(seen: MarkSeen): { readonly [key: string]: Json } {
  return { ...seen };
}
