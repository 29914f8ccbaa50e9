import type { ReviewView } from '#shared/contracts/closure.ts';
import { CaseNumber } from '#shared/contracts/ids.ts';
import type { Answer } from '#shared/rules/may.ts';
import type { ReadinessPoint } from '#shared/rules/readiness.ts';
import type { SealedPart } from '../../sealing/manifest.ts';
import type { findClosureRow, HeldCase, listAcceptedNotes, RoundRow, SignatureRow } from './queries/closures.ts';

/** What is sealed or would be; a part that still grows has no fingerprint yet. */
export type ContentShown = { parts: (Omit<SealedPart, 'hash'> & { hash: string | null })[]; contentHash: string };

type Standing = {
  readonly readiness: readonly ReadinessPoint[];
  readonly accepted: Awaited<ReturnType<typeof listAcceptedNotes>>;
  readonly rounds: readonly RoundRow[];
  readonly signatures: readonly SignatureRow[];
  readonly content: ContentShown | null;
  readonly closure: Awaited<ReturnType<typeof findClosureRow>>;
  readonly acts: {
    send: Answer;
    sendBack: Answer;
    acceptNotes: Answer;
    sign: { authored: Answer; checked: Answer; approved: Answer };
  };
  readonly zone: string;
};

export function presentReview(heldCase: HeldCase, standing: Standing): ReviewView {
  const { content, closure, acts } = standing;
  return {
    number: CaseNumber.parse(heldCase.number),
    state: heldCase.state,
    readiness: standing.readiness.map((point) => ({ ...point, accepted: presentAcceptance(point, standing.accepted) })),
    rounds: standing.rounds.map(presentRound),
    signatures: standing.signatures.map((row) => presentSignature(row, content?.contentHash ?? null)),
    parts: (content?.parts ?? []).map(({ key, chapter, name, holding, hash }) => ({
      key,
      chapter,
      name,
      holding,
      hash,
    })),
    contentHash: content?.contentHash ?? null,
    closure: closure && {
      sealNumber: closure.sealNumber,
      rootHash: closure.rootHash,
      closedBy: { id: closure.closedBy, name: closure.closedByName },
      closedAt: closure.closedAt.toISOString(),
    },
    acts: {
      send: presentAnswer(acts.send),
      sendBack: presentAnswer(acts.sendBack),
      acceptNotes: presentAnswer(acts.acceptNotes),
      sign: {
        authored: presentAnswer(acts.sign.authored),
        checked: presentAnswer(acts.sign.checked),
        approved: presentAnswer(acts.sign.approved),
      },
    },
    zone: standing.zone,
  };
}

const presentAnswer = (answer: Answer) => ({
  allowed: answer.allowed,
  reason: answer.allowed ? null : answer.reason,
});

function presentAcceptance(point: ReadinessPoint, accepted: Standing['accepted']) {
  const row = point.kind === 'note' ? accepted.find((each) => each.note === point.sentence) : undefined;
  if (!row) return null;
  const by = { id: row.acceptedBy, name: row.acceptedByName };
  return { by, at: row.acceptedAt.toISOString(), reason: row.reason };
}

function presentRound(row: RoundRow): ReviewView['rounds'][number] {
  const { round, findingsVersion, outcome, reasons, endedBy, endedByName } = row;
  return {
    ...{ round, findingsVersion, outcome, reasons },
    sentBy: { id: row.sentBy, name: row.sentByName },
    sentAt: row.sentAt.toISOString(),
    endedBy: endedBy !== null && endedByName !== null ? { id: endedBy, name: endedByName } : null,
    endedAt: row.endedAt?.toISOString() ?? null,
  };
}

function presentSignature(row: SignatureRow, contentHash: string | null): ReviewView['signatures'][number] {
  const { id, personId, printedName, meaning, zone, round } = row;
  return {
    ...{ id, personId, printedName, meaning, zone, round },
    contentHash: row.contentHash,
    signedAt: row.signedAt.toISOString(),
    matches: row.contentHash === contentHash,
  };
}
