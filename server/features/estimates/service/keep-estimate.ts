import type { Method } from '#shared/numeric/methods/method.ts';
import { boundaryMismatch } from '#shared/rules/mirror-boundary-match.ts';
import { reckonEstimate, type EstimateReckoned } from '#shared/rules/reckon-estimate.ts';
import { refusalInWords } from '#shared/wording/refusal.ts';
import { recordAct } from '../../../audit/record-act.ts';
import { Problem } from '../../../http/problem.ts';
import { markDependentsStale, recordLineage } from '../../../lineage/lineage.ts';
import { settleStaleness } from '../../../lineage/settle-staleness.ts';
import { insertEstimate, insertEstimateInputs, takeEstimateNumber, type EstimateRow } from '../queries/estimates.ts';
import { givenFrom, sourceOf, type ResolvedInput } from './resolved-input.ts';
import { refuseWrong, type InputReader } from './resolve-inputs.ts';

export type EstimateToKeep = {
  readonly method: Method;
  readonly inputs: readonly ResolvedInput[];
  /** The estimate it stands in for. */
  readonly supersedes: EstimateRow | null;
  readonly boundaryNote: string;
  readonly remark: string;
};

/**
 * Reckons and keeps an estimate under the next number of its case, with its lineage and its audit entry. One that stands
 * in for another settles that one's staleness, and makes stale what hangs on it unless the stress is the same.
 * @throws Problem not-valid by input, in the words of the method's refusal
 */
export async function keepEstimate(reader: InputReader, wanted: EstimateToKeep): Promise<string> {
  const { tx, context, heldCase } = reader;
  const { method, inputs, supersedes, remark } = wanted;
  const override = boundaryOverride(wanted);
  const reckoned = reckonEstimate(method, givenFrom(inputs));
  if (reckoned.kind === 'refused') {
    throw new Problem('not-valid', refusalInWords(reckoned.code, reckoned.label), {
      field: `inputs.${reckoned.field}`,
      fields: { [`inputs.${reckoned.field}`]: refusalInWords(reckoned.code, reckoned.label) },
      stillHolds: 'What was typed is kept on the page.',
    });
  }
  const number = await takeEstimateNumber(tx, heldCase);
  const { id } = await insertEstimate(tx, {
    caseId: heldCase.id,
    number,
    line: reckoned.line,
    method: method.id,
    methodVersion: method.version,
    stressMPa: reckoned.origin.value,
    standardUncertaintyMPa: reckoned.origin.standardUncertainty,
    outputs: reckoned.outputs,
    budget: reckoned.budget,
    cautions: [...override, ...reckoned.cautions],
    supersedesId: supersedes?.id ?? null,
    remark,
    madeBy: context.person.id,
    madeAt: tx.at,
  });
  await insertEstimateInputs(
    tx,
    inputs.map((input) => ({ ...input, caseId: heldCase.id, estimateId: id })),
  );
  await recordLineage(tx, { kind: 'estimate', id }, inputs.flatMap(sourceOf));
  await tellOfSuperseded(reader, { id, number, reckoned, supersedes });
  await recordAct(tx, context.person, {
    act: supersedes ? 'estimate.renewed' : 'estimate.made',
    inCase: heldCase,
    objectId: id,
    before: supersedes ? { estimate: supersedes.number, stress: stressOf(supersedes) } : null,
    after: { estimate: number, line: reckoned.line, method: method.id, stress: reckoned.origin },
    reason: remark === '' ? null : remark,
  });
  return id;
}

/** The radius and the constant must name one boundary, unless a person says why not; then the record says so too. */
function boundaryOverride({ inputs, boundaryNote }: EstimateToKeep) {
  const radius = inputs.find((input) => input.name === 'R');
  const constant = inputs.find((input) => input.name === 'A');
  if (!radius || !constant) return [];
  const mismatch = boundaryMismatch(radius.boundary ?? 'not stated', constant.boundary ?? 'not stated');
  if (mismatch === null) return [];
  if (boundaryNote === '') refuseWrong({ 'inputs.R': mismatch });
  const sentence = 'The radius and the mirror constant do not name the same boundary.';
  return [{ code: 'boundary-overridden', weight: 'warning', sentence, note: boundaryNote }];
}

async function tellOfSuperseded(
  { tx, context }: InputReader,
  made: { id: string; number: number; reckoned: EstimateReckoned; supersedes: EstimateRow | null },
): Promise<void> {
  const { supersedes: old, reckoned } = made;
  if (!old) return;
  await settleStaleness(tx, old.id, { by: context.person.id, settlement: 'taken', reason: null });
  const { value, standardUncertainty } = reckoned.origin;
  if (value === old.stressMPa && standardUncertainty === old.standardUncertaintyMPa) return;
  await markDependentsStale(tx, {
    kind: 'estimate',
    oldId: old.id,
    newId: made.id,
    why: `estimate ${old.number} was made again as estimate ${made.number} by ${context.person.name}`,
  });
}

function stressOf(row: EstimateRow) {
  return { value: row.stressMPa, standardUncertainty: row.standardUncertaintyMPa, unit: 'MPa' };
}
