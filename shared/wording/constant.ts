import { constantKindTable, type ConstantKind } from '../vocabulary/constant-kinds.ts';
import { estimatedParts, unitText } from './quantity.ts';

const noBreakSpace = '\u00A0';

type ConstantShown = { readonly kind: ConstantKind; readonly value: number; readonly standardUncertainty: number };

/** A constant in parts for a page: value, U (k = 2) and unit as shown; GPa stands for moduli. */
export function constantParts({ kind, value, standardUncertainty }: ConstantShown) {
  const { unit } = constantKindTable[kind];
  const { value: shown, plusMinus } = estimatedParts({ value, standardUncertainty, unit: '1' });
  return { value: shown, plusMinus, unit: unit === 'GPa' ? unit : unitText(unit) };
}

/** A constant in a sentence: "3.50 ± 0.20 MPa m½". */
export function formatConstant(constant: ConstantShown): string {
  const { value, plusMinus, unit } = constantParts(constant);
  return [value, '±', plusMinus, ...(unit === '' ? [] : [unit])].join(noBreakSpace);
}
