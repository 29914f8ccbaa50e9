import { parseQuantity, type QuantityRead, type QuantityRefused, type QuantityWanted } from './parse-quantity.ts';

export type MeasuredRead = {
  readonly kind: 'read';
  /** In our unit of the kind. */
  readonly value: number;
  /** U (k = 2), in the same unit, > 0. */
  readonly expandedUncertainty: number;
  readonly unit: QuantityRead['unit'];
  /** As it was entered; the unit is that of the value. */
  readonly typed: { readonly text: string; readonly unit: string };
};

const plusMinus = /±|\+\/[-−]|\+-/;

/**
 * Reads a measured quantity typed as value ± U (k = 2) into our unit, or says in words why not. One unit after both
 * serves both.
 * @example parseMeasured('6.412 kg ± 5 g', { kind: 'mass', openUnit: true }) // 6412 g, U 5 g
 */
export function parseMeasured(text: string, wanted: QuantityWanted): MeasuredRead | QuantityRefused {
  const [valueText = '', uncertaintyText, ...more] = text.split(plusMinus).map((part) => part.trim());
  if (uncertaintyText === undefined || more.length > 0 || uncertaintyText === '') return withoutInterval(valueText);
  const uncertainty = parseQuantity(uncertaintyText, wanted);
  if (uncertainty.kind === 'refused') return uncertainty;
  const value = parseQuantity(endsInDigit(valueText) ? `${valueText} ${uncertainty.typed.unit}` : valueText, wanted);
  if (value.kind === 'refused') return value;
  if (uncertainty.value <= 0) return { kind: 'refused', reason: `The ± of ${valueText} must be more than nothing.` };
  return {
    kind: 'read',
    value: value.value,
    expandedUncertainty: uncertainty.value,
    unit: value.unit,
    typed: { text: text.trim(), unit: value.typed.unit },
  };
}

function endsInDigit(text: string): boolean {
  return /[\d.,]$/.test(text);
}

function withoutInterval(valueText: string): QuantityRefused {
  const example = valueText === '' ? '6.412 kg ± 5 g' : `${valueText} ± …`;
  return { kind: 'refused', reason: `Say how sure it is, with its unit: ${example}` };
}
