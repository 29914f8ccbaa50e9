import type { EstimateView, EstimateWantedInput, InputView } from '#shared/contracts/estimates.ts';
import type { Method, NumberInput } from '#shared/numeric/methods/method.ts';
import { methods } from '#shared/numeric/methods.ts';
import { readNumber } from '#shared/numeric/units/read-number.ts';
import { sourcesOfInput } from '#shared/rules/input-sources.ts';
import type { EstimateLine } from '#shared/vocabulary/estimate-lines.ts';
import { measuredQuantities } from '#shared/vocabulary/measured-quantities.ts';
import { mirrorBoundaries } from '#shared/vocabulary/mirror-boundaries.ts';
import { uncertaintyForms, type UncertaintyForm } from '#shared/vocabulary/uncertainty-forms.ts';

/** One input as it is being filled in: every way in keeps what was entered there, whichever is chosen now. */
export type DraftInput = {
  from: 'typed' | 'mark' | 'constant';
  text: string;
  uncertaintyText: string;
  uncertaintyAs: UncertaintyForm;
  note: string;
  boundary: string;
  /** "markId quantity". */
  reading: string;
  /** The reader's own relative standard uncertainty, %, or empty for the reading's. */
  percent: string;
  constantId: string;
};

export type EstimateDraft = {
  method: string;
  inputs: Record<string, DraftInput>;
  boundaryNote: string;
  remark: string;
};

/** The newest version of every method of a line. */
export function methodsOf(line: EstimateLine): readonly Method[] {
  return methods.filter(
    (method) =>
      method.line === line && !methods.some((other) => other.id === method.id && other.version > method.version),
  );
}

export function numberInputs(method: Method): NumberInput[] {
  return method.inputs.filter((input) => input.kind === 'number');
}

/** The ways in that an input has, the likeliest first. */
export function waysOf(name: string): DraftInput['from'][] {
  const { quantities, constants } = sourcesOfInput(name);
  return [
    ...(quantities.length > 0 ? ['mark' as const] : []),
    ...(constants.length > 0 ? ['constant' as const] : []),
    'typed',
  ];
}

function emptyInput(name: string): DraftInput {
  return {
    from: waysOf(name)[0] ?? 'typed',
    text: '',
    uncertaintyText: '',
    uncertaintyAs: 'standard',
    note: '',
    boundary: '',
    reading: '',
    percent: '',
    constantId: '',
  };
}

/** A draft for any method of a line: inputs of the same name are shared, so that a change of method loses nothing. */
export function emptyDraft(line: EstimateLine): EstimateDraft {
  const offered = methodsOf(line);
  const names = offered.flatMap((method) => method.inputs.map((input) => input.name));
  const inputs = Object.fromEntries([...new Set(names)].map((name) => [name, emptyInput(name)]));
  return { method: offered[0]?.id ?? '', inputs, boundaryNote: '', remark: '' };
}

/** A draft that says what an estimate was made from, to be made again with changes. */
export function draftFrom(estimate: EstimateView): EstimateDraft {
  const empty = emptyDraft(estimate.line);
  const filled = Object.fromEntries(estimate.inputs.map((input) => [input.name, filledFrom(input)]));
  const boundaryNote = estimate.cautions.find((caution) => caution.code === 'boundary-overridden')?.note ?? '';
  return {
    method: estimate.method.id,
    inputs: { ...empty.inputs, ...filled },
    boundaryNote,
    remark: estimate.remark,
  };
}

function filledFrom(input: InputView): DraftInput {
  const empty = emptyInput(input.name);
  const { source, enteredText, enteredUncertainty } = input;
  if (source.kind === 'measurement') {
    const percent = enteredUncertainty === null ? '' : enteredUncertainty.replace(/\s*%$/, '');
    return { ...empty, from: 'mark', reading: `${source.markId} ${source.quantity}`, percent };
  }
  if (source.kind === 'material constant') return { ...empty, from: 'constant', constantId: source.constantId };
  const [uncertaintyText = '', form] = (enteredUncertainty ?? '').split(', ');
  const uncertaintyAs = uncertaintyForms.find((each) => each === form) ?? 'standard';
  const boundary = input.boundary ?? '';
  return {
    ...empty,
    from: 'typed',
    text: enteredText ?? '',
    uncertaintyText,
    uncertaintyAs,
    note: source.note,
    boundary,
  };
}

/** What is sent. An optional input left empty is not; a choice not made goes as an empty typing, to be refused by name. */
export function wantedFrom(method: Method, draft: EstimateDraft, supersedesId: string | null): EstimateWantedInput {
  const inputs = numberInputs(method).flatMap((input): [string, EstimateWantedInput['inputs'][string]][] => {
    const entered = draft.inputs[input.name];
    return entered && !(input.optional && isEmpty(entered)) ? [[input.name, wantedInput(entered)]] : [];
  });
  const { boundaryNote, remark } = draft;
  return { method: method.id, inputs: Object.fromEntries(inputs), supersedesId, boundaryNote, remark };
}

export function isEmpty(entered: DraftInput): boolean {
  if (entered.from === 'mark') return entered.reading === '';
  return entered.from === 'constant' ? entered.constantId === '' : entered.text.trim() === '';
}

function wantedInput(entered: DraftInput): EstimateWantedInput['inputs'][string] {
  const { text, uncertaintyText, uncertaintyAs, note } = entered;
  if (entered.from === 'constant' && entered.constantId !== '') {
    return { from: 'constant', constantId: entered.constantId };
  }
  const reading = readingOf(entered);
  if (entered.from === 'mark' && reading) {
    return { from: 'mark', ...reading, relativeUncertaintyPercent: percentOf(entered) };
  }
  const boundary = mirrorBoundaries.find((each) => each === entered.boundary) ?? null;
  const typed = entered.from === 'typed' ? text : '';
  return { from: 'typed', text: typed, uncertaintyText, uncertaintyAs, note, boundary };
}

/** The mark and quantity chosen, or nothing. */
export function readingOf({ reading }: DraftInput) {
  const [, markId = '', words = ''] = /^(\S+) (.*)$/.exec(reading) ?? [];
  const quantity = measuredQuantities.find((each) => each === words);
  return quantity ? { markId, quantity } : null;
}

/** The reader's own relative standard uncertainty, %, or nothing where none is stated or it cannot be read. */
export function percentOf({ percent }: DraftInput): number | null {
  const read = readNumber(percent.replace('%', ''));
  return read.kind === 'read' && read.number > 0 ? read.number : null;
}
