import type { EvidenceView, MatePairView, PartView, PieceView } from '#shared/contracts/evidence.ts';
import { may, type CaseAct } from '#shared/rules/may.ts';
import type { Face } from '#shared/vocabulary/pieces.ts';
import { limitSentence } from '#shared/wording/limit-sentence.ts';
import type { Reader } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { factsOf, type HeldFor } from '../../../rights/open-case.ts';
import { presentMate, presentPart, presentPieces } from '../present.ts';
import { findPairOfFace, listFragmentRows, listMateRows, listPartRows } from '../queries.ts';

/** All of the chapter: what broke, every piece, and which faces belong together. */
export async function readEvidence(context: Context, heldCase: HeldFor<'read'>): Promise<EvidenceView> {
  const { reader, person } = context;
  const answer = may(person, 'change evidence', factsOf(heldCase));
  return {
    parts: await listParts(reader, heldCase),
    pieces: await listPieces(reader, heldCase),
    mates: await listMates(reader, heldCase),
    change: { allowed: answer.allowed, reason: answer.allowed ? null : answer.reason },
    closedAt: heldCase.closedAt?.toISOString() ?? null,
  };
}

/** What broke: the parts of the case. */
export async function listParts(reader: Reader, heldCase: HeldFor<CaseAct>): Promise<PartView[]> {
  return (await listPartRows(reader, heldCase)).map(presentPart);
}

/** Every piece of the case, a piece before what was made from it. */
export async function listPieces(reader: Reader, heldCase: HeldFor<CaseAct>): Promise<PieceView[]> {
  return presentPieces(await listFragmentRows(reader, heldCase));
}

/** The pairs of mating faces that hold now. */
export async function listMates(reader: Reader, heldCase: HeldFor<CaseAct>): Promise<MatePairView[]> {
  return (await listMateRows(reader, heldCase)).map(presentMate);
}

/** The face that was one with this face before the break; null while it is not paired. */
export async function mateOf(
  reader: Reader,
  caseId: string,
  fragmentId: string,
  face: Face,
): Promise<MatePairView['one'] | null> {
  const row = await findPairOfFace(reader, caseId, fragmentId, face);
  if (!row) return null;
  const { one, other } = presentMate(row);
  return one.fragmentId === fragmentId && one.face === face ? other : one;
}

export type LimitOfPiece = { readonly fragmentId: string; readonly code: string; readonly sentence: string };

/** For each missing piece that the origin may lie on, the sentence that stands among the limits of the findings. */
export async function limitSentences(reader: Reader, heldCase: HeldFor<CaseAct>): Promise<LimitOfPiece[]> {
  const pieces = await listPieces(reader, heldCase);
  return pieces.flatMap(({ id, code, description, status, missingReason, originLies }) => {
    if (status !== 'missing' || missingReason === null || originLies === null) return [];
    const sentence = limitSentence({ code, description, missingReason, originLies });
    return sentence === null ? [] : [{ fragmentId: id, code, sentence }];
  });
}
