import { z } from 'zod';
import { CautionView, type WantedInput } from '#shared/contracts/estimates.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import type { EstimateRow } from '../queries/estimates.ts';
import { findConstantInForce, listInputRows, listReadingSources, type InputRow } from '../queries/inputs.ts';
import { keepEstimate } from './keep-estimate.ts';
import { loadSuperseded } from './load-superseded.ts';
import { methodFor } from './make-estimate.ts';
import { resolveInputs, type InputReader } from './resolve-inputs.ts';
import type { ResolvedInput } from './resolved-input.ts';

/**
 * Makes an estimate again from the records in force now: marks as they stand, scales as bound, constants as recorded.
 * What was typed stays. The old one is kept and superseded.
 * @returns the new one's id
 */
export function renewEstimate(
  context: Context,
  heldCase: HeldFor<'estimate'>,
  id: string,
  renewed: { remark: string },
): Promise<string> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'estimate');
    const reader = { tx, context, heldCase };
    const old = await loadSuperseded(reader, id);
    const method = methodFor(old.method);
    const rows = await listInputRows(tx, [old.id]);
    const read = rows.filter((row) => row.sourceKind !== 'typed');
    const wanted = await Promise.all(read.map((row) => wantedAgain(reader, row)));
    const named = new Set(read.map((row) => row.name));
    const again = await resolveInputs(
      reader,
      { ...method, inputs: method.inputs.filter((input) => named.has(input.name)) },
      Object.fromEntries(read.map((row, index) => [row.name, wanted[index]])),
    );
    const inputs = rows.map((row) => again.find((input) => input.name === row.name) ?? typedAgain(row));
    const remark = renewed.remark === '' ? old.remark : renewed.remark;
    return keepEstimate(reader, { method, inputs, supersedes: old, boundaryNote: boundaryNoteOf(old), remark });
  });
}

async function wantedAgain({ tx }: InputReader, row: InputRow): Promise<WantedInput> {
  const sourceId = row.sourceId ?? lost(row);
  if (row.sourceKind === 'material constant') {
    const constant = await findConstantInForce(tx, sourceId);
    return { from: 'constant', constantId: constant?.id ?? sourceId };
  }
  const [source] = await listReadingSources(tx, [sourceId]);
  const { markId, quantity } = source ?? lost(row);
  return { from: 'mark', markId, quantity, relativeUncertaintyPercent: statedPercent(row) };
}

/** The reader's own relative standard uncertainty of a reading, %, or nothing where the reading's own was taken. */
export function statedPercent(row: Pick<InputRow, 'enteredUncertainty'>): number | null {
  return row.enteredUncertainty === null ? null : Number.parseFloat(row.enteredUncertainty);
}

function typedAgain(row: InputRow): ResolvedInput {
  const { id: _id, caseId: _caseId, estimateId: _estimateId, ...input } = row;
  return input;
}

/** Why boundaries that do not match were used together, said when the old one was made. */
function boundaryNoteOf(old: EstimateRow): string {
  const cautions = z.array(CautionView).parse(old.cautions);
  return cautions.find((caution) => caution.code === 'boundary-overridden')?.note ?? '';
}

function lost(row: InputRow): never {
  throw new Error(`input ${row.name} of estimate ${row.estimateId} names a source that is not there`);
}
