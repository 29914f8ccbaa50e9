import type { FindingsFacts } from '#shared/contracts/findings.ts';
import type { MarkView } from '#shared/contracts/marks.ts';
import type { OriginLies } from '#shared/vocabulary/pieces.ts';
import { readinessOf, type ReadinessFacts, type ReadinessPoint } from '#shared/rules/readiness.ts';
import type { Reader } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { listQuestions } from '../../cases/service/agree-questions.ts';
import { listParts, listPieces } from '../../evidence/service/read-evidence.ts';
import { listEstimates } from '../../estimates/service/list-estimates.ts';
import { findFindingsFacts } from '../../findings/service/read-text.ts';
import { listFractographs } from '../../fractographs/service/find-fractographs.ts';
import { listCaseMarks } from '../../marks/service/list-marks.ts';
import type { HeldCase } from '../queries/closures.ts';

/** What stands between the case and its review, read where `reader` reads: a transaction under way, or the pool. */
export async function listReadiness(reader: Reader, context: Context, heldCase: HeldCase): Promise<ReadinessPoint[]> {
  return readinessOf(await gatherFacts(reader, context, heldCase));
}

async function gatherFacts(reader: Reader, context: Context, heldCase: HeldCase): Promise<ReadinessFacts> {
  const questions = await listQuestions(reader, heldCase);
  const parts = await listParts(reader, heldCase);
  const marks = await listCaseMarks({ ...context, reader }, heldCase);
  const findings = await findFindingsFacts(reader, heldCase);
  return {
    onHold: heldCase.holdReason !== null,
    agreedQuestions: questions.at(0)?.questions.length ?? 0,
    parts: parts.length,
    fractographs: await fractographFacts(reader, heldCase, marks),
    originsMarked: marks.filter((mark) => mark.kind === 'origin').length,
    missingPieces: missingPieces(await listPieces(reader, heldCase), findings),
    estimates: await estimateFacts(reader, heldCase),
    findings: { ...findings, isEmpty: isEmptyText(findings) },
  };
}

/** Whether no line stands in the text but the titles of its empty parts. */
function isEmptyText({ text, emptyParts }: FindingsFacts): boolean {
  return text.split('\n').every((line) => line.trim() === '' || emptyParts.includes(line));
}

const readForLength: readonly MarkView['kind'][] = ['mirror', 'flaw outline', 'length'];

async function fractographFacts(reader: Reader, heldCase: HeldCase, marks: readonly MarkView[]) {
  return (await listFractographs(reader, heldCase)).map(({ id, figureNumber, state, scale }) => ({
    figureNumber,
    state,
    hasScale: scale !== null,
    marksWithLength: marks.filter((mark) => mark.fractographId === id && readForLength.includes(mark.kind)).length,
  }));
}

async function estimateFacts(reader: Reader, heldCase: HeldCase) {
  const { estimates } = await listEstimates(reader, heldCase);
  return estimates
    .filter((estimate) => estimate.supersededById === null)
    .map(({ number, line, standing, stale }) => ({
      number,
      line,
      isSetAside: standing.standing === 'set aside',
      isStale: stale !== null,
    }));
}

type Piece = { readonly code: string; readonly status: string; readonly originLies: OriginLies | null };

function missingPieces(pieces: readonly Piece[], { text }: FindingsFacts): ReadinessFacts['missingPieces'] {
  const names = (code: string) => new RegExp(`(^|[^A-Z0-9])${code}([^0-9]|$)`).test(text);
  return pieces.flatMap(({ code, status, originLies }) =>
    status === 'missing' && originLies !== null ? [{ code, originLies, isNamedInFindings: names(code) }] : [],
  );
}
