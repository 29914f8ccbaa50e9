import { createHash } from 'node:crypto';
import { pipeline } from 'node:stream/promises';
import type { CheckOutcome, ClosureCheckView } from '#shared/contracts/closure.ts';
import { hashOfEntry } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import type { HeldFor } from '../../../rights/open-case.ts';
import {
  compareWithPart,
  contentHashOf,
  Manifest,
  rootHashOf,
  type Deviation,
  type SealedFile,
  type SealedPart,
  type SealedTable,
} from '../../../sealing/manifest.ts';
import { sealNumberOf } from '../../../sealing/seal-number.ts';
import type { Storage } from '../../../storage/storage.ts';
import { recomputeEstimate } from '../../estimates/service/recompute-estimate.ts';
import { findClosureRow, hasRootHash, listSignatureRows, type HeldCase } from '../queries/closures.ts';
import { listTrail } from '../queries/trail.ts';
import { gatherTable } from './gather-content.ts';
import { contentParts, trailPart } from './part-table.ts';

type ClosureRow = NonNullable<Awaited<ReturnType<typeof findClosureRow>>>;
type Checked = { words: string; outcome: CheckOutcome };

/**
 * Looks a closed case over again: gathers every row and hashes every file anew, holds them against the list that was
 * sealed, the list against the seal, each signature against its content, and reckons every estimate again.
 */
export async function checkClosure(context: Context, heldCase: HeldFor<'read'>): Promise<ClosureCheckView> {
  const { manifest, ...found } = await context.inTransaction(async (tx) => {
    const closure = await findClosureRow(tx, heldCase);
    if (!closure)
      throw new Problem('wrong-state', `${heldCase.number} is not closed yet; there is no seal to look over.`);
    const manifest = Manifest.parse(closure.manifest);
    return {
      manifest,
      checkedAt: tx.at.toISOString(),
      seal: await checkSeal(tx, heldCase, closure, manifest),
      parts: await checkParts(tx, heldCase, manifest),
      signatures: await checkSignatures(tx, heldCase, manifest),
      estimates: await checkEstimates(tx, manifest),
    };
  });
  const files = await checkFiles(
    context.storage,
    manifest.parts.flatMap((part) => part.files),
  );
  const outcomes = [...found.seal, ...found.parts, ...files, ...found.signatures].map((each) => each.outcome);
  const whole = outcomes.every((outcome) => outcome === 'same') && found.estimates.every((each) => each.same);
  return { ...found, files, whole };
}

const told = (words: string, isSame: boolean): Checked => ({ words, outcome: isSame ? 'same' : 'changed' });

async function checkSeal(tx: Transaction, heldCase: HeldCase, closure: ClosureRow, manifest: Manifest) {
  const rootHash = rootHashOf(manifest);
  const { previousRootHash } = manifest;
  const hasPrevious = previousRootHash === '' || (await hasRootHash(tx, previousRootHash));
  const closedAt = [heldCase.closedAt?.toISOString(), closure.closedAt.toISOString()];
  return [
    told('The list of what is sealed', rootHash === closure.rootHash && manifest.number === heldCase.number),
    told('The seal number', sealNumberOf(rootHash) === closure.sealNumber),
    told('When it was closed', heldCase.state === 'closed' && closedAt.every((at) => at === manifest.closedAt)),
    told('The closure before it', hasPrevious && closure.previousRootHash === previousRootHash),
    told('The chain of who did what', await isTrailChained(tx, heldCase)),
  ];
}

/** Whether every entry of the trail, also those after the closing, follows the one before it by its hash. */
async function isTrailChained(tx: Transaction, heldCase: HeldCase): Promise<boolean> {
  const entries = await listTrail(tx, heldCase);
  return entries.every(
    ({ hash, ...entry }, index) =>
      entry.previousHash === (index === 0 ? '' : entries[index - 1].hash) && hash === hashOfEntry(entry),
  );
}

async function checkParts(tx: Transaction, heldCase: HeldCase, manifest: Manifest) {
  const checked: ClosureCheckView['parts'] = [];
  for (const part of manifest.parts) {
    const deviations = compareWithPart(part, await tablesNow(tx, heldCase, part));
    checked.push({ key: part.key, name: part.name, outcome: worstOf(deviations), deviations });
  }
  return checked;
}

async function tablesNow(tx: Transaction, heldCase: HeldCase, part: SealedPart): Promise<SealedTable[]> {
  const tables = [...contentParts, trailPart].find((each) => each.key === part.key)?.tables ?? [];
  const now: SealedTable[] = [];
  for (const table of tables) {
    const sealed = part.tables.find((each) => each.table === table);
    const found = await gatherTable(tx, heldCase, { table, columns: sealed?.columns });
    now.push(table === 'audit_entries' && sealed ? upToSealed(sealed, found) : found);
  }
  return now;
}

/** The trail goes on after a closure; what came later is no part of it. */
function upToSealed(sealed: SealedTable, found: SealedTable): SealedTable {
  const last = Math.max(...sealed.rows.map((row) => Number(row.id)));
  return { ...found, rows: found.rows.filter((row) => Number(row.id) <= last) };
}

function worstOf(deviations: readonly Deviation[]): CheckOutcome {
  return (
    (['missing', 'changed', 'added'] as const).find((outcome) => deviations.some((each) => each.outcome === outcome)) ??
    'same'
  );
}

async function checkSignatures(tx: Transaction, heldCase: HeldCase, manifest: Manifest): Promise<Checked[]> {
  const keys = new Set(contentParts.map((part) => part.key));
  const contentHash = contentHashOf(
    manifest.number,
    manifest.parts.filter((part) => keys.has(part.key)),
  );
  const given = await listSignatureRows(tx, heldCase);
  const lastRound = Math.max(0, ...given.map((each) => each.round));
  // What was signed in an earlier round was sent back and written on: it vouches for what stood then.
  return given
    .filter((each) => each.round === lastRound)
    .map((each) => told(`${each.printedName}, ${each.meaning}`, each.contentHash === contentHash));
}

async function checkEstimates(tx: Transaction, manifest: Manifest) {
  const sealed = manifest.parts.flatMap((part) => part.tables).find((table) => table.table === 'estimates');
  const checked: ClosureCheckView['estimates'] = [];
  for (const { id } of sealed?.rows ?? []) {
    const again = await recomputeEstimate(tx, id).catch(() => null);
    if (again) checked.push({ number: again.number, same: again.same });
  }
  return checked.sort((one, other) => one.number - other.number);
}

async function checkFiles(storage: Storage, files: readonly SealedFile[]): Promise<Checked[]> {
  const checked: Checked[] = [];
  for (const { sha256, words } of files) checked.push({ words, outcome: await outcomeOfFile(storage, sha256) });
  return checked;
}

async function outcomeOfFile(storage: Storage, sha256: string): Promise<CheckOutcome> {
  const hash = createHash('sha256');
  try {
    await pipeline(await storage.readOriginal(sha256), hash);
  } catch {
    return 'missing';
  }
  return hash.digest('hex') === sha256 ? 'same' : 'changed';
}
