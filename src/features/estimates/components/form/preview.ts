import type { ConstantView } from '#shared/contracts/materials.ts';
import type { MeasurementView } from '#shared/contracts/marks.ts';
import type { GivenNumber, Method, NumberInput } from '#shared/numeric/methods/method.ts';
import { boundaryOfConstant } from '#shared/rules/input-sources.ts';
import { boundaryMismatch } from '#shared/rules/mirror-boundary-match.ts';
import { readTypedInput } from '#shared/rules/read-typed-input.ts';
import { reckonEstimate, type EstimateReckoned } from '#shared/rules/reckon-estimate.ts';
import { mirrorBoundaries, type MirrorBoundary } from '#shared/vocabulary/mirror-boundaries.ts';
import { inputText } from '#shared/wording/input-quantity.ts';
import { echoQuantity } from '#shared/wording/quantity.ts';
import { refusalInWords } from '#shared/wording/refusal.ts';
import { isEmpty, numberInputs, percentOf, readingOf, type DraftInput, type EstimateDraft } from './draft.ts';

/** What marks and constants an input may be chosen from. */
export type Offered = {
  readonly measurements: readonly MeasurementView[];
  readonly constants: readonly ConstantView[];
};

/** What an input reads as it stands. */
export type InputPreview =
  | { readonly kind: 'empty' }
  | { readonly kind: 'wrong'; readonly reason: string; readonly part: 'value' | 'uncertainty'; readonly echo?: string }
  | {
      readonly kind: 'read';
      readonly given: GivenNumber;
      readonly boundary: MirrorBoundary | null;
      readonly echo: string;
    };

export type DraftPreview = {
  readonly inputs: Readonly<Record<string, InputPreview>>;
  readonly reckoned: EstimateReckoned | null;
  /** What is missing or refused, in words; empty once there is a stress. */
  readonly hindrance: string;
  /** Why radius and constant do not go together; null where they do. */
  readonly mismatch: string | null;
};

/** What the server would answer to a draft, worked with the same code, before anything is kept. */
export function previewDraft(method: Method, draft: EstimateDraft, offered: Offered): DraftPreview {
  const inputs: Record<string, InputPreview> = {};
  const given: Record<string, GivenNumber> = {};
  const missing: string[] = [];
  for (const input of numberInputs(method)) {
    const entered = draft.inputs[input.name];
    const preview = entered ? previewInput(input, entered, offered) : { kind: 'empty' as const };
    inputs[input.name] = preview;
    if (preview.kind === 'read') given[input.name] = preview.given;
    else if (preview.kind === 'wrong' || !input.optional) missing.push(input.label.toLowerCase());
  }
  const mismatch = mismatchOf(inputs);
  if (missing.length > 0)
    return { inputs, reckoned: null, hindrance: `Still wanted: ${missing.join(', ')}.`, mismatch };
  const reckoned = reckonEstimate(method, given);
  if (reckoned.kind === 'value') return { inputs, reckoned, hindrance: '', mismatch };
  return { inputs, reckoned: null, hindrance: refusalInWords(reckoned.code, reckoned.label), mismatch };
}

function previewInput(input: NumberInput, entered: DraftInput, offered: Offered): InputPreview {
  if (isEmpty(entered)) return { kind: 'empty' };
  if (entered.from === 'typed') return previewTyped(input, entered);
  if (entered.from === 'constant') return previewConstant(input, entered, offered.constants);
  return previewReading(input, entered, offered.measurements);
}

function previewTyped(input: NumberInput, entered: DraftInput): InputPreview {
  const read = readTypedInput(input, entered);
  if (read.kind === 'refused') return { kind: 'wrong', reason: read.reason, part: read.part };
  const { quantity, standardUncertainty, distribution } = read;
  if (standardUncertainty === undefined && input.uncertainty === 'expected') {
    const reason = refusalInWords('missing-uncertainty', input.label);
    return { kind: 'wrong', reason, part: 'uncertainty', echo: echoQuantity(quantity) };
  }
  const { value } = quantity;
  const inOurUnit = quantity.typed.unit === input.unit;
  const full = inputText({ value, standardUncertainty: standardUncertainty ?? 0, unit: input.unit });
  const echo = inOurUnit ? full : `${echoQuantity(quantity)}; ${full}`;
  const boundary = mirrorBoundaries.find((each) => each === entered.boundary) ?? null;
  return {
    kind: 'read',
    given: { value, standardUncertainty: standardUncertainty ?? 0, distribution },
    boundary,
    echo,
  };
}

function previewConstant(input: NumberInput, entered: DraftInput, constants: readonly ConstantView[]): InputPreview {
  const constant = constants.find((each) => each.id === entered.constantId);
  if (!constant) return { kind: 'empty' };
  const { value, standardUncertainty, kind, source } = constant;
  const echo = `${inputText({ value, standardUncertainty, unit: input.unit })}, ${source}`;
  return { kind: 'read', given: { value, standardUncertainty }, boundary: boundaryOfConstant(kind), echo };
}

function previewReading(
  input: NumberInput,
  entered: DraftInput,
  measurements: readonly MeasurementView[],
): InputPreview {
  const wanted = readingOf(entered);
  const reading = measurements.find((each) => each.markId === wanted?.markId && each.quantity === wanted.quantity);
  if (!reading) return { kind: 'empty' };
  const { valueMm: value, standardUncertaintyMm, way, figureNumber, boundary } = reading;
  if (value === null || standardUncertaintyMm === null) {
    return { kind: 'wrong', reason: `Fig. ${figureNumber} is uncalibrated: give it its scale first.`, part: 'value' };
  }
  const percent = percentOf(entered);
  const standardUncertainty = percent === null ? standardUncertaintyMm : (value * percent) / 100;
  const echo = `${inputText({ value, standardUncertainty, unit: input.unit })}, ${way}`;
  return { kind: 'read', given: { value, standardUncertainty }, boundary, echo };
}

function mismatchOf(inputs: Readonly<Record<string, InputPreview>>): string | null {
  const { R: radius, A: constant } = inputs;
  if (radius?.kind !== 'read' || constant?.kind !== 'read') return null;
  return boundaryMismatch(radius.boundary ?? 'not stated', constant.boundary ?? 'not stated');
}
