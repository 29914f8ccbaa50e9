import type { ConstantTyped } from '../contracts/materials.ts';
import { parseQuantity, type QuantityWanted } from '../numeric/units/parse-quantity.ts';
import { constantKindTable, type ConstantKind } from '../vocabulary/constant-kinds.ts';

export type ConstantRead = {
  readonly kind: 'read';
  /** In the unit of the kind: MPa√m, GPa or 1. */
  readonly value: number;
  readonly standardUncertainty: number;
  readonly enteredText: string;
  readonly enteredUnit: string;
};
export type ConstantRefused = {
  readonly kind: 'refused';
  readonly field: 'value' | 'plusMinus';
  readonly reason: string;
};

const mpaPerGPa = 1000;
// U = k u with k = 2, about 95 %.
const coverageFactor = 2;
// An isotropic solid's Poisson's ratio lies below one half.
const poissonBound = 0.5;

/**
 * Reads a constant as typed into the unit of its kind. The value needs its unit, but for pure numbers; ± takes the
 * value's unit where none is typed with it.
 */
export function readConstant(
  typed: Pick<ConstantTyped, 'kind' | 'value' | 'plusMinus' | 'plusMinusIs'>,
): ConstantRead | ConstantRefused {
  const wanted = wantedFor(typed.kind);
  const value = parseQuantity(typed.value, wanted);
  if (value.kind === 'refused') return { kind: 'refused', field: 'value', reason: value.reason };
  const plusMinus = parseQuantity(typed.plusMinus, { ...wanted, openUnit: false, defaultUnit: value.typed.unit });
  if (plusMinus.kind === 'refused') return { kind: 'refused', field: 'plusMinus', reason: plusMinus.reason };
  const factor = constantKindTable[typed.kind].unit === 'GPa' ? 1 / mpaPerGPa : 1;
  const asked = refusalOf(typed.kind, value.value * factor, plusMinus.value);
  if (asked) return asked;
  return {
    kind: 'read',
    value: value.value * factor,
    standardUncertainty: (plusMinus.value * factor) / (typed.plusMinusIs === 'U' ? coverageFactor : 1),
    enteredText: `${typed.value} ± ${typed.plusMinus} (${typed.plusMinusIs === 'U' ? 'k = 2' : 'standard'})`,
    enteredUnit: value.typed.unit,
  };
}

function wantedFor(kind: ConstantKind): QuantityWanted {
  const { unit } = constantKindTable[kind];
  if (unit === '1') return { kind: 'dimensionless', openUnit: false };
  return { kind: unit === 'GPa' ? 'stress' : 'toughness', openUnit: true };
}

function refusalOf(kind: ConstantKind, value: number, plusMinus: number): ConstantRefused | null {
  const refused = (field: ConstantRefused['field'], reason: string): ConstantRefused => ({
    kind: 'refused',
    field,
    reason,
  });
  if (value <= 0) return refused('value', `The ${constantKindTable[kind].word} is more than 0.`);
  if (kind === 'Poisson ratio' && value >= poissonBound)
    return refused('value', "Poisson's ratio of a solid lies below 0.5.");
  if (plusMinus <= 0) return refused('plusMinus', 'The ± is more than 0: no constant is known exactly.');
  return null;
}
