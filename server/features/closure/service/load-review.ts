import type { ReviewView } from '#shared/contracts/closure.ts';
import { may, type Answer } from '#shared/rules/may.ts';
import type { ReadinessPoint } from '#shared/rules/readiness.ts';
import { signatureMeanings, type SignatureMeaning } from '#shared/vocabulary/signatures.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { factsOf, type HeldFor } from '../../../rights/open-case.ts';
import { contentHashOf, Manifest } from '../../../sealing/manifest.ts';
import { presentReview, type ContentShown } from '../present.ts';
import {
  findClosureRow,
  listAcceptedNotes,
  listRoundRows,
  listSignatureRows,
  type HeldCase,
  type SignatureRow,
} from '../queries/closures.ts';
import { gatherContent, gatherTrail } from './gather-content.ts';
import { listReadiness } from './gather-facts.ts';
import { contentParts } from './part-table.ts';

/** All of the chapter: what stands in the way, the rounds, who signed, what is sealed, and what this person may do. */
export function loadReview(context: Context, heldCase: HeldFor<'read'>): Promise<ReviewView> {
  return context.inTransaction(async (tx) => {
    const closure = await findClosureRow(tx, heldCase);
    const readiness = heldCase.state === 'closed' ? [] : await listReadiness(tx, context, heldCase);
    const content = closure
      ? sealedContent(heldCase.number, Manifest.parse(closure.manifest))
      : await contentNow(tx, heldCase);
    const signatures = await listSignatureRows(tx, heldCase);
    const accepted = await listAcceptedNotes(tx, heldCase);
    return presentReview(heldCase, {
      ...{ readiness, accepted, closure, signatures, content },
      rounds: await listRoundRows(tx, heldCase),
      acts: actsOf(context, heldCase, {
        ...{ readiness, signatures },
        acceptedNotes: new Set(accepted.map((each) => each.note)),
        contentHash: content?.contentHash ?? null,
      }),
      zone: context.zone,
    });
  });
}

function sealedContent(number: string, { parts }: Manifest): ContentShown {
  const keys = new Set(contentParts.map((part) => part.key));
  return {
    parts,
    contentHash: contentHashOf(
      number,
      parts.filter((part) => keys.has(part.key)),
    ),
  };
}

/** What would be sealed; nothing before a first review, when it still changes with every act. */
async function contentNow(tx: Transaction, heldCase: HeldCase): Promise<ContentShown | null> {
  if (heldCase.state !== 'in review') return null;
  const { parts, contentHash } = await gatherContent(tx, heldCase);
  return { parts: [...parts, { ...(await gatherTrail(tx, heldCase)), hash: null }], contentHash };
}

type Standing = {
  readonly readiness: readonly ReadinessPoint[];
  readonly signatures: readonly SignatureRow[];
  readonly acceptedNotes: ReadonlySet<string>;
  readonly contentHash: string | null;
};

/** What this person may do here now, with the reason beside what they may not. The acts themselves ask again. */
function actsOf({ person }: Context, heldCase: HeldCase, standing: Standing) {
  const facts = factsOf(heldCase);
  const blockers = standing.readiness.filter((point) => point.kind === 'blocker').length;
  const send = may(person, 'send to review', facts);
  const sign = (meaning: SignatureMeaning): Answer => {
    const answer = may(person, `sign as ${meaning}`, facts);
    if (!answer.allowed) return answer;
    if (standing.contentHash === null) return closed('The case is signed once it is in review.');
    if (hasSigned(standing, meaning, person.id)) return closed(`You have signed this as ${meaning}.`);
    return meaning === 'approved' ? approval(standing, blockers) : answer;
  };
  const [authored, checked, approved] = signatureMeanings.map(sign);
  return {
    send: send.allowed && blockers > 0 ? closed(`Opens once ${countedPoints(blockers)} settled.`) : send,
    sendBack: may(person, 'send back', facts),
    acceptNotes: may(person, 'accept a note', facts),
    sign: { authored, checked, approved },
  };
}

function approval(standing: Standing, blockers: number): Answer {
  const isAuthored = standing.signatures.some(
    ({ meaning, contentHash }) => meaning === 'authored' && contentHash === standing.contentHash,
  );
  const notes = standing.readiness.filter(
    ({ kind, sentence }) => kind === 'note' && !standing.acceptedNotes.has(sentence),
  ).length;
  if (blockers > 0) return closed(`Opens once ${countedPoints(blockers)} settled.`);
  if (notes > 0) return closed(`Opens once ${notes === 1 ? 'one note is' : `${notes} notes are`} accepted.`);
  if (!isAuthored) return closed('Opens once an author has signed what stands here.');
  return { allowed: true };
}

const hasSigned = ({ signatures, contentHash }: Standing, meaning: SignatureMeaning, personId: string) =>
  signatures.some((each) => each.personId === personId && each.meaning === meaning && each.contentHash === contentHash);

const countedPoints = (count: number) => (count === 1 ? 'the point above is' : `the ${count} points above are`);
const closed = (reason: string): Answer => ({ allowed: false, reason });
