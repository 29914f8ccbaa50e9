import type { WantedInput } from '#shared/contracts/estimates.ts';
import type { Method, NumberInput } from '#shared/numeric/methods/method.ts';
import { boundaryOfConstant, sourcesOfInput } from '#shared/rules/input-sources.ts';
import { readTypedInput } from '#shared/rules/read-typed-input.ts';
import { constantKindTable } from '#shared/vocabulary/constant-kinds.ts';
import { refusalInWords } from '#shared/wording/refusal.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { readMeasurement } from '../../marks/service/read-measurement.ts';
import { loadConstant } from '../../materials/service/list-constants.ts';
import type { HeldCase } from '../queries/estimates.ts';
import { findScaleInForce, holdCalibrationOf, holdMaterial } from '../queries/inputs.ts';
import type { ResolvedInput } from './resolved-input.ts';

type Wanted<From extends WantedInput['from']> = Extract<WantedInput, { from: From }>;

/** What an act reads inputs with. */
export type InputReader = { readonly tx: Transaction; readonly context: Context; readonly heldCase: HeldCase };

/**
 * Turns what was typed and chosen into values in our units, each with its uncertainty and its source record.
 * @throws Problem not-valid naming every wrong input as `inputs.<name>`
 */
export async function resolveInputs(
  reader: InputReader,
  method: Method,
  wanted: Readonly<Record<string, WantedInput>>,
): Promise<ResolvedInput[]> {
  const resolved: ResolvedInput[] = [];
  const wrong: Record<string, string> = {};
  for (const input of method.inputs) {
    if (input.kind !== 'number') continue;
    const answer = await resolveOne(reader, input, wanted[input.name]);
    if (typeof answer === 'string') wrong[`inputs.${input.name}`] = answer;
    else if (answer) resolved.push(answer);
  }
  for (const name of Object.keys(wanted)) {
    if (method.inputs.some((input) => input.name === name)) continue;
    wrong[`inputs.${name}`] = refusalInWords('unknown-input', name);
  }
  refuseWrong(wrong);
  return resolved;
}

/** @throws Problem not-valid with the first wrong field and all of them */
export function refuseWrong(wrong: Readonly<Record<string, string>>): void {
  const [first] = Object.entries(wrong);
  if (!first) return;
  const [field, sentence] = first;
  throw new Problem('not-valid', sentence, { field, fields: wrong, stillHolds: 'What was typed is kept on the page.' });
}

/** The input resolved, why it cannot be, or nothing where an optional one was left out. */
async function resolveOne(
  reader: InputReader,
  input: NumberInput,
  wanted: WantedInput | undefined,
): Promise<ResolvedInput | string | null> {
  if (!wanted || (wanted.from === 'typed' && wanted.text.trim() === '')) {
    return input.optional ? null : refusalInWords('non-finite-input', input.label);
  }
  if (wanted.from === 'typed') return resolveTyped(input, wanted);
  if (wanted.from === 'constant') return resolveConstant(reader, input, wanted);
  return resolveMark(reader, input, wanted);
}

function resolveTyped(input: NumberInput, typed: Wanted<'typed'>): ResolvedInput | string {
  const read = readTypedInput(input, typed);
  if (read.kind === 'refused') return read.reason;
  if (read.standardUncertainty === undefined && input.uncertainty === 'expected') {
    return refusalInWords('missing-uncertainty', input.label);
  }
  return {
    name: input.name,
    value: read.quantity.value,
    standardUncertainty: read.standardUncertainty ?? 0,
    unit: input.unit,
    distribution: read.distribution,
    enteredText: typed.text.trim(),
    enteredUnit: read.quantity.typed.unit,
    enteredUncertainty:
      typed.uncertaintyText.trim() === '' ? null : `${typed.uncertaintyText.trim()}, ${typed.uncertaintyAs}`,
    boundary: typed.boundary,
    sourceKind: 'typed',
    sourceId: null,
    sourceNote: typed.note,
  };
}

async function resolveConstant(
  { tx }: InputReader,
  input: NumberInput,
  { constantId }: Wanted<'constant'>,
): Promise<ResolvedInput | string> {
  const known = await takenOrRefused(() => loadConstant(tx, constantId));
  if (typeof known === 'string') return `${input.label}: there is no such constant; choose one from the materials.`;
  await holdMaterial(tx, known.materialId);
  const constant = await loadConstant(tx, constantId);
  if (constant.supersededById !== null) {
    return `${input.label}: record ${constant.recordNumber} has been replaced; choose the one in force.`;
  }
  if (!sourcesOfInput(input.name).constants.includes(constant.kind)) {
    return `${input.label} is not a ${constantKindTable[constant.kind].word}: choose a constant of the right kind.`;
  }
  return {
    name: input.name,
    value: constant.value,
    standardUncertainty: constant.standardUncertainty,
    unit: input.unit,
    distribution: 'normal',
    enteredText: null,
    enteredUnit: null,
    enteredUncertainty: null,
    boundary: boundaryOfConstant(constant.kind),
    sourceKind: 'material constant',
    sourceId: constant.id,
    sourceNote: '',
  };
}

/** A length read now from its mark and scale; the reader's own relative uncertainty stands in place of the reading's. */
async function resolveMark(
  { tx, context, heldCase }: InputReader,
  input: NumberInput,
  { markId, quantity, relativeUncertaintyPercent: percent }: Wanted<'mark'>,
): Promise<ResolvedInput | string> {
  if (!sourcesOfInput(input.name).quantities.includes(quantity)) {
    return `${input.label} is not read as ${quantity}: choose a mark that says it.`;
  }
  const taken = await takenOrRefused(() => readMeasurement(tx, context, heldCase, { markId, quantity }));
  if (typeof taken === 'string') return `${input.label}: ${taken}`;
  await holdCalibrationOf(tx, taken.bindingId);
  const scale = await findScaleInForce(tx, taken.bindingId);
  if (scale?.isReplaced) {
    return `${input.label}: the scale of its image has been replaced by ${scale.code ?? 'a newer one'}; bind the image to it first.`;
  }
  return {
    name: input.name,
    value: taken.valueMm,
    standardUncertainty: percent === null ? taken.standardUncertaintyMm : (taken.valueMm * percent) / 100,
    unit: input.unit,
    distribution: 'normal',
    enteredText: null,
    enteredUnit: null,
    enteredUncertainty: percent === null ? null : `${percent} %`,
    boundary: taken.boundary,
    sourceKind: 'measurement',
    sourceId: taken.id,
    sourceNote: '',
  };
}

/** A refusal of the marks becomes the sentence of the input that wanted the reading. */
async function takenOrRefused<Taken>(take: () => Promise<Taken>): Promise<Taken | string> {
  try {
    return await take();
  } catch (refusal) {
    if (refusal instanceof Problem) return refusal.message;
    throw refusal;
  }
}
