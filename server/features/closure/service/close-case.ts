import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import { rootHashOf, type Manifest, type SealedPart } from '../../../sealing/manifest.ts';
import { sealNumberOf } from '../../../sealing/seal-number.ts';
import { moveCase } from '../../cases/service/move-case.ts';
import {
  endRound,
  insertClosure,
  listAcceptedNotes,
  listSignatureRows,
  takeLastRootHash,
  type RoundRow,
} from '../queries/closures.ts';
import { listReadiness } from './gather-facts.ts';
import { gatherTrail } from './gather-content.ts';

export type Closing = {
  readonly locked: HeldFor<'sign as approved' | 'sign as authored' | 'sign as checked'>;
  readonly round: RoundRow;
  readonly content: { readonly parts: readonly SealedPart[]; readonly contentHash: string };
};

/** @throws Problem not-ready while blockers are open, notes not accepted, or no author has signed this very content */
export async function requireClosable(tx: Transaction, context: Context, { locked, content }: Closing): Promise<void> {
  const points = await listReadiness(tx, context, locked);
  const accepted = new Set((await listAcceptedNotes(tx, locked)).map((each) => each.note));
  const signatures = await listSignatureRows(tx, locked);
  const isAuthored = signatures.some(
    ({ meaning, contentHash }) => meaning === 'authored' && contentHash === content.contentHash,
  );
  const blocker = points.find((point) => point.kind === 'blocker');
  if (blocker) throw notYet(blocker.sentence);
  const note = points.find((point) => point.kind === 'note' && !accepted.has(point.sentence));
  if (note) throw notYet(`${note.sentence} Accept this note with a reason, or send the case back.`);
  if (!isAuthored)
    throw notYet('No author has signed what stands here; it is approved after it is signed as authored.');
}

const notYet = (sentence: string) =>
  new Problem('not-ready', sentence, { stillHolds: 'Nothing was signed; the case stays in review.' });

/**
 * Freezes the case under its lock: ends the round, lists everything with its fingerprint, chains the list to the
 * closure before it, and closes. The row of the closure comes before the state, which seals it.
 * @returns the seal number
 */
export async function closeCase(
  tx: Transaction,
  context: Context,
  { locked, round, content }: Closing,
): Promise<string> {
  const { person } = context;
  await endRound(tx, round.id, { outcome: 'approved', endedBy: person.id, endedAt: tx.at });
  const manifest: Manifest = {
    format: 1,
    number: locked.number,
    closedAt: tx.at.toISOString(),
    parts: [...content.parts, await gatherTrail(tx, locked)],
    previousRootHash: await takeLastRootHash(tx),
  };
  const rootHash = rootHashOf(manifest);
  const sealNumber = sealNumberOf(rootHash);
  const { previousRootHash } = manifest;
  const closure = { sealNumber, manifest, rootHash, previousRootHash, closedBy: person.id, closedAt: tx.at };
  const made = await insertClosure(tx, { ...closure, caseId: locked.id });
  await recordAct(tx, person, {
    act: 'case.closed',
    inCase: locked,
    objectId: made.id,
    after: { sealNumber, rootHash, previousRootHash },
  });
  await moveCase(tx, context, locked, 'closed');
  return sealNumber;
}
