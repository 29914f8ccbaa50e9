import type { SignatureGiven } from '#shared/contracts/closure.ts';
import { CaseNumber } from '#shared/contracts/ids.ts';
import type { SignatureMeaning } from '#shared/vocabulary/signatures.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, openCase, type HeldFor } from '../../../rights/open-case.ts';
import type { SealedPart } from '../../../sealing/manifest.ts';
import { confirmPassword } from '../../people/service/confirm-password.ts';
import { insertSignature, listSignatureRows, type RoundRow } from '../queries/closures.ts';
import { closeCase, requireClosable } from './close-case.ts';
import { gatherContent } from './gather-content.ts';
import { loadOpenRound } from './load-open-round.ts';

type SignAct = `sign as ${SignatureMeaning}`;
type Signing = {
  readonly locked: HeldFor<SignAct>;
  readonly round: RoundRow;
  readonly content: { readonly parts: SealedPart[]; readonly contentHash: string };
};

/**
 * Signs exactly what the signer had before them; a signature as approved closes and seals the case in the same act.
 *
 * The right is that of the meaning; the password is asked once more, and counted like a sign-in when wrong.
 * @throws Problem stale-version where the content is no longer what was read, not-ready where approval has to wait
 */
export async function signCase(
  context: Context,
  heldCase: HeldFor<'read'>,
  { meaning, password, contentHash }: SignatureGiven,
  machine: string,
): Promise<{ signatureId: string; sealNumber: string | null }> {
  const act: SignAct = `sign as ${meaning}`;
  const opened = await openCase(context, CaseNumber.parse(heldCase.number), act);
  await confirmPassword(context, password, machine);
  return context.inTransaction(async (tx) => {
    const locked = await lockCase(tx, context, opened, act);
    const round = await loadOpenRound(tx, locked);
    const content = await gatherContent(tx, locked);
    if (content.contentHash !== contentHash)
      throw new Problem('stale-version', 'What stands here is no longer what you read. Read it again, then sign.', {
        stillHolds: 'Nothing was signed.',
        current: { contentHash: content.contentHash },
      });
    const signing = { locked, round, content };
    await refuseSecondSignature(tx, context, signing, meaning);
    if (meaning === 'approved') await requireClosable(tx, context, signing);
    const signatureId = await keepSignature(tx, context, signing, meaning);
    const sealNumber = meaning === 'approved' ? await closeCase(tx, context, signing) : null;
    return { signatureId, sealNumber };
  });
}

async function refuseSecondSignature(
  tx: Transaction,
  { person }: Context,
  signing: Signing,
  meaning: SignatureMeaning,
) {
  const given = await listSignatureRows(tx, signing.locked);
  const isSame = given.some(
    (each) =>
      each.personId === person.id &&
      each.meaning === meaning &&
      each.reviewId === signing.round.id &&
      each.contentHash === signing.content.contentHash,
  );
  if (isSame) throw new Problem('already-there', `You have signed this as ${meaning} already.`);
}

async function keepSignature(tx: Transaction, context: Context, signing: Signing, meaning: SignatureMeaning) {
  const { locked, round, content } = signing;
  const { id } = await insertSignature(tx, {
    caseId: locked.id,
    reviewId: round.id,
    personId: context.person.id,
    printedName: context.person.name,
    meaning,
    contentHash: content.contentHash,
    proof: 'password again',
    signedAt: tx.at,
    zone: context.zone,
  });
  await recordAct(tx, context.person, {
    act: 'signature.given',
    inCase: locked,
    objectId: id,
    after: { meaning, contentHash: content.contentHash, round: round.round },
  });
  return id;
}
