import { boundaryMismatch } from '#shared/rules/mirror-boundary-match.ts';
import { markReadings } from '#shared/rules/mark-readings.ts';
import { reckonEstimate, type EstimateReckoned } from '#shared/rules/reckon-estimate.ts';
import { boundaryOfConstant } from '#shared/rules/input-sources.ts';
import { inputText } from '#shared/wording/input-quantity.ts';
import { refusalInWords } from '#shared/wording/refusal.ts';
import type { Reader } from '../../../database/connection.ts';
import { readOne } from '../../marks/service/readings.ts';
import { methodOf } from '../present/estimate.ts';
import { unitOf } from '../present/inputs.ts';
import type { EstimateRow, HeldCase } from '../queries/estimates.ts';
import { findConstantInForce, findScaleInForce, listReadingSources, type InputRow } from '../queries/inputs.ts';
import { statedPercent } from './renew-estimate.ts';
import { givenFrom } from './resolved-input.ts';

type InputNow = InputRow & {
  /** The calibration in force behind it and its relative standard uncertainty, where it is read off an image. */
  readonly scale: { readonly calibrationId: string; readonly relativeUncertainty: number } | null;
};

export type WouldBe = {
  readonly reckoned: EstimateReckoned | null;
  readonly inputs: readonly InputNow[];
  readonly changes: readonly { input: string; label: string; was: string; now: string }[];
  readonly hindrance: string | null;
};

/**
 * What an estimate would become from the records in force now. Nothing is written, so it holds for a closed case too; a
 * calibration that has been replaced is followed to the one in force even where the image is still bound to the old.
 */
export async function reckonWouldBe(
  reader: Reader,
  heldCase: HeldCase,
  row: EstimateRow,
  inputs: readonly InputRow[],
): Promise<WouldBe> {
  const method = methodOf(row);
  const labelOf = (name: string) => method.inputs.find((input) => input.name === name)?.label ?? name;
  const now: InputNow[] = [];
  for (const input of inputs) {
    const found = await inputNow(reader, heldCase, input);
    if (!found) {
      const hindrance = `${labelOf(input.name)} can no longer be read: its mark says it no more.`;
      return { reckoned: null, inputs: [], changes: [], hindrance };
    }
    now.push(found);
  }
  const changes = now.flatMap((after, index) => {
    const unit = unitOf(method, after.name);
    const before = inputs[index] ?? after;
    const [was, is] = [inputText({ ...before, unit }), inputText({ ...after, unit })];
    return was === is ? [] : [{ input: after.name, label: labelOf(after.name), was, now: is }];
  });
  const mismatch = mismatchOf(inputs, now);
  if (mismatch !== null) return { reckoned: null, inputs: now, changes, hindrance: mismatch };
  const reckoned = reckonEstimate(method, givenFrom(now));
  if (reckoned.kind === 'value') return { reckoned, inputs: now, changes, hindrance: null };
  return { reckoned: null, inputs: now, changes, hindrance: refusalInWords(reckoned.code, reckoned.label) };
}

/** A mismatch of boundaries that was not there before; one that a person went on with is not brought up again. */
function mismatchOf(before: readonly InputRow[], now: readonly InputRow[]): string | null {
  const boundariesOf = (inputs: readonly InputRow[]) => {
    const [radius, constant] = ['R', 'A'].map((name) => inputs.find((input) => input.name === name));
    return radius && constant
      ? boundaryMismatch(radius.boundary ?? 'not stated', constant.boundary ?? 'not stated')
      : null;
  };
  return boundariesOf(before) === null ? boundariesOf(now) : null;
}

async function inputNow(reader: Reader, heldCase: HeldCase, input: InputRow): Promise<InputNow | null> {
  if (input.sourceId === null || input.sourceKind === 'typed') return { ...input, scale: null };
  if (input.sourceKind === 'material constant') {
    const constant = await findConstantInForce(reader, input.sourceId);
    if (!constant) return null;
    const { value, standardUncertainty, kind, id } = constant;
    return { ...input, value, standardUncertainty, boundary: boundaryOfConstant(kind), sourceId: id, scale: null };
  }
  const [source] = await listReadingSources(reader, [input.sourceId]);
  return source ? readingNow(reader, heldCase, input, source) : null;
}

async function readingNow(
  reader: Reader,
  heldCase: HeldCase,
  input: InputRow,
  wanted: Pick<Awaited<ReturnType<typeof listReadingSources>>[number], 'markId' | 'quantity'>,
): Promise<InputNow | null> {
  const read = await readOne(reader, heldCase, wanted);
  const scale = read?.bindingId ? await findScaleInForce(reader, read.bindingId) : null;
  if (!read || !scale) return null;
  const reading = markReadings(read.mark, scale, read.origin).find((each) => each.quantity === wanted.quantity);
  if (!reading || reading.quantity === 'hackle direction') return null;
  const { valueMm, standardUncertaintyMm } = reading;
  if (valueMm === null || standardUncertaintyMm === null) return null;
  const percent = statedPercent(input);
  return {
    ...input,
    value: valueMm,
    standardUncertainty: percent === null ? standardUncertaintyMm : (valueMm * percent) / 100,
    boundary: read.mark.boundary,
    scale: { calibrationId: scale.id, relativeUncertainty: scale.relativeUncertainty },
  };
}
