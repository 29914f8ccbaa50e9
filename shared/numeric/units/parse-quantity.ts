import { ourUnitOf, type OurUnit, type UnitKind } from './our-units.ts';
import { readNumber } from './read-number.ts';
import { findUnit, unitNamesOf, type Unit } from './unit-table.ts';

export type QuantityRead = {
  readonly kind: 'read';
  /** In our unit. */
  readonly value: number;
  readonly unit: OurUnit;
  /** As it was entered; kept beside the value. */
  readonly typed: { readonly text: string; readonly number: number; readonly unit: string };
};
export type QuantityRefused = { readonly kind: 'refused'; readonly reason: string };

export type QuantityWanted = {
  readonly kind: UnitKind;
  /** True where a number without a unit is refused. */
  readonly openUnit: boolean;
  /** The unit of a bare number where that is allowed; our own unit when absent. */
  readonly defaultUnit?: string;
};

const kindInWords: Readonly<Record<UnitKind, string>> = {
  length: 'length',
  force: 'force',
  stress: 'stress',
  toughness: 'toughness',
  mass: 'mass',
  dimensionless: 'plain ratio',
  modulus: 'modulus',
  stressRate: 'stress rate',
  stressGradient: 'stress gradient',
  angle: 'angle',
  speed: 'speed',
  stiffness: 'stiffness',
  compliance: 'compliance',
  time: 'time',
  temperatureDifference: 'temperature difference',
  expansion: 'thermal expansion',
  heatTransfer: 'heat transfer',
  conductivity: 'heat conductivity',
  growthConstant: 'constant of slow growth',
  stressSquared: 'covariance of stresses',
};

// Masses that are typed where a force is meant.
const forceMeant: Readonly<Record<string, string>> = {
  lb: 'lbf',
  lbs: 'lbf',
  '#': 'lbf',
  pound: 'lbf',
  pounds: 'lbf',
  kg: 'kgf',
  g: 'gf',
};

/**
 * Reads one typed quantity into our unit, or says in words why not. Single numbers only; an uncertainty has its own field.
 * @example parseQuantity('0.118 in', { kind: 'length', openUnit: true }) // 2.9972 mm
 */
export function parseQuantity(text: string, wanted: QuantityWanted): QuantityRead | QuantityRefused {
  const { numberText, unitText } = split(text);
  if (numberText === '')
    return refused(`Type a number${wanted.openUnit ? ` with its unit, ${choices(wanted.kind)}` : ''}.`);
  const read = readNumber(numberText);
  if (read.kind === 'ambiguous') return refused(ambiguity(numberText));
  if (read.kind === 'unreadable') return refused(`“${numberText}” is not a number that can be read.`);
  const unit = unitFor(unitText, numberText, wanted);
  if ('reason' in unit) return unit;
  return {
    kind: 'read',
    value: read.number * unit.factor,
    unit: ourUnitOf[wanted.kind],
    typed: { text, number: read.number, unit: unit.name },
  };
}

function unitFor(unitText: string, numberText: string, wanted: QuantityWanted): Unit | QuantityRefused {
  if (unitText === '') return bareUnit(numberText, wanted);
  const forceUnit = forceMeant[unitText.toLowerCase()];
  if (forceUnit && wanted.kind !== 'mass') return refused(massForForce(unitText, forceUnit, wanted.kind));
  const unit = findUnit(unitText, wanted.kind);
  if (!unit) return refused(`“${unitText}” is not a unit known here: say ${choices(wanted.kind)}.`);
  if (unit.kind !== wanted.kind) {
    return refused(`${unit.name} is a unit of ${kindInWords[unit.kind]}, and ${wantedInWords(wanted.kind)}.`);
  }
  return unit;
}

function bareUnit(numberText: string, wanted: QuantityWanted): Unit | QuantityRefused {
  if (wanted.openUnit && wanted.kind !== 'dimensionless') {
    return refused(`${numberText} has no unit: say ${choices(wanted.kind)}.`);
  }
  const unit = findUnit(wanted.defaultUnit ?? ourUnitOf[wanted.kind], wanted.kind);
  if (!unit) throw new Error(`No unit “${wanted.defaultUnit}” to read a bare number in`);
  return unit;
}

function massForForce(unitText: string, forceUnit: string, kind: UnitKind): string {
  if (kind === 'force') return `${unitText} is a unit of mass: say ${forceUnit} for a force.`;
  return `${unitText} is a unit of mass, and ${wantedInWords(kind)}.`;
}

function wantedInWords(kind: UnitKind): string {
  if (kind === 'dimensionless') return 'a plain number is wanted here';
  const article = kind === 'angle' ? 'an' : 'a';
  return `${article} ${kindInWords[kind]} is wanted here: say ${choices(kind)}`;
}

function ambiguity(numberText: string): string {
  const point = numberText.replace(',', '.');
  return `${numberText} could be ${point} or ${numberText.replace(',', '')}: type it with a point or without the comma.`;
}

function choices(kind: UnitKind): string {
  const names = kind === 'dimensionless' ? ['a plain number', '%'] : unitNamesOf(kind);
  return [names.slice(0, -1).join(', '), names.at(-1)].filter(Boolean).join(' or ');
}

function refused(reason: string): QuantityRefused {
  return { kind: 'refused', reason };
}

/** The number is everything up to the last digit that starts no unit; units such as MPa m^0.5 keep their own digits. */
function split(text: string): { numberText: string; unitText: string } {
  const [, numberText = '', unitText = ''] =
    /^\s*((?:[+−–-]\s*)?[\d.,](?:[\d.,]|\s(?=\d))*(?:[eE][+−-]?\d+)?)?\s*(.*?)\s*$/.exec(text) ?? [];
  return { numberText: numberText.trim(), unitText };
}
