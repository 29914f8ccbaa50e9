import { FindingsNode, type FindingsVersionLine, type FindingsVersionView } from '#shared/contracts/findings.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { hashOfContent } from '../../../sealing/canonical-hash.ts';
import { presentVersion } from '../present.ts';
import { findVersionRow, insertVersion, listVersionRows } from '../queries/versions.ts';
import { readText, resolvedText } from './read-text.ts';

/**
 * Keeps the text as it stands in the database under a name, values written out, with the SHA-256 of its canonical JSON.
 * Call it inside an act that has locked the case.
 * @returns the record's id, its number in the case and its hash
 */
export async function keepFindingsVersion(
  tx: Transaction,
  context: Context,
  heldCase: HeldFor<CaseAct>,
  name: string,
): Promise<{ id: string; number: number; contentHash: string }> {
  const content = resolvedText(await readText(tx, heldCase));
  const contentHash = hashOfContent(content);
  const [last] = await listVersionRows(tx, heldCase);
  const number = (last?.number ?? 0) + 1;
  const { id } = await insertVersion(tx, {
    caseId: heldCase.id,
    number,
    name,
    content,
    contentHash,
    madeBy: context.person.id,
    madeAt: tx.at,
  });
  await recordAct(tx, context.person, {
    act: 'findings.version-kept',
    inCase: heldCase,
    objectId: id,
    after: { version: number, name, contentHash },
  });
  return { id, number, contentHash };
}

/** Keeps a version under a name that a writer gives it. */
export async function nameVersion(
  context: Context,
  heldCase: HeldFor<'write findings'>,
  name: string,
): Promise<FindingsVersionLine> {
  const { number } = await context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'write findings');
    return keepFindingsVersion(tx, context, heldCase, name);
  });
  const { content: _content, ...line } = await loadVersion(context, heldCase, number);
  return line;
}

/** The named versions, newest first. */
export async function listVersions(context: Context, heldCase: HeldFor<CaseAct>): Promise<FindingsVersionLine[]> {
  return (await listVersionRows(context.reader, heldCase)).map(presentVersion);
}

/** One version whole. @throws Problem not-found */
export async function loadVersion(
  context: Context,
  heldCase: HeldFor<CaseAct>,
  number: number,
): Promise<FindingsVersionView> {
  const row = await findVersionRow(context.reader, heldCase, number);
  if (!row) throw nothingHere();
  return { ...presentVersion(row), content: FindingsNode.parse(row.content) };
}
