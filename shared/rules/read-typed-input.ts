import type { NumberInput } from '../numeric/methods/method.ts';
import { standardUncertaintyFrom, type Distribution } from '../numeric/uncertainty/standard-uncertainty.ts';
import { parseQuantity, type QuantityRead } from '../numeric/units/parse-quantity.ts';
import { readNumber } from '../numeric/units/read-number.ts';
import type { UncertaintyForm } from '../vocabulary/uncertainty-forms.ts';

export type TypedQuantity = {
  readonly text: string;
  /** "0.01 mm", "6 %" of the value, or a bare number in the unit the value was typed in; empty when none is stated. */
  readonly uncertaintyText: string;
  readonly uncertaintyAs: UncertaintyForm;
};

export type TypedInputRead = {
  readonly kind: 'read';
  readonly quantity: QuantityRead;
  /** In our unit; absent where none was typed. */
  readonly standardUncertainty: number | undefined;
  readonly distribution: Distribution;
};
export type TypedInputRefused = {
  readonly kind: 'refused';
  readonly part: 'value' | 'uncertainty';
  readonly reason: string;
};

const coverageFactor = 2;

/** Reads one typed input of a method with its uncertainty into our units, or says in words what is wrong with it. */
export function readTypedInput(input: NumberInput, typed: TypedQuantity): TypedInputRead | TypedInputRefused {
  const quantity = parseQuantity(typed.text, { kind: input.unitKind, openUnit: input.openUnit });
  if (quantity.kind === 'refused') return refused('value', `${input.label}: ${quantity.reason}`);
  const distribution = distributionOf[typed.uncertaintyAs];
  if (typed.uncertaintyText.trim() === '')
    return { kind: 'read', quantity, standardUncertainty: undefined, distribution };
  const stated = statedUncertainty(input, typed, quantity);
  if (typeof stated === 'string') return refused('uncertainty', `± of ${input.label}: ${stated}`);
  if (stated < 0) return refused('uncertainty', `± of ${input.label} must be 0 or more.`);
  const standardUncertainty = standardUncertaintyOf(typed.uncertaintyAs, stated);
  return { kind: 'read', quantity, standardUncertainty, distribution };
}

const distributionOf: Readonly<Record<UncertaintyForm, Distribution>> = {
  standard: 'normal',
  expanded: 'normal',
  rectangular: 'rectangular',
  triangular: 'triangular',
};

/** What was stated, in our unit, or why it cannot be read. */
function statedUncertainty(input: NumberInput, typed: TypedQuantity, quantity: QuantityRead): number | string {
  const [, percent] = /^(.*?)\s*%$/.exec(typed.uncertaintyText.trim()) ?? [];
  if (percent !== undefined) {
    const read = readNumber(percent);
    return read.kind === 'read'
      ? (Math.abs(quantity.value) * read.number) / 100
      : `“${percent}” is not a number that can be read.`;
  }
  const read = parseQuantity(typed.uncertaintyText, {
    kind: input.unitKind,
    openUnit: false,
    defaultUnit: quantity.typed.unit,
  });
  return read.kind === 'read' ? read.value : read.reason;
}

function standardUncertaintyOf(form: UncertaintyForm, stated: number): number {
  if (form === 'standard') return standardUncertaintyFrom({ kind: 'standard', standardUncertainty: stated });
  if (form === 'expanded') {
    return standardUncertaintyFrom({ kind: 'expanded', expandedUncertainty: stated, coverageFactor });
  }
  return standardUncertaintyFrom({ kind: form, halfWidth: stated });
}

function refused(part: 'value' | 'uncertainty', reason: string): TypedInputRefused {
  return { kind: 'refused', part, reason };
}
