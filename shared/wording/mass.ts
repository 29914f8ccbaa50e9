import { findUnit } from '../numeric/units/unit-table.ts';
import { formatNumber, type EstimatedParts } from './quantity.ts';

const gramsPerKilogram = 1000;
const gramsPerMilligram = 1e-3;
// Binary rounding of g ↔ kg shows up beyond the twelfth figure; no balance reads so many.
const figuresKept = 12;

/** A mass as kept: g, U (k = 2) in g, and the typing where there was one. */
export type KeptMass = { readonly g: number; readonly uncertaintyG: number; readonly entered: string | null };

/**
 * A mass ± U (k = 2) in parts, in the unit it was typed in, every digit of it kept: "6.412 ± 0.005 kg".
 * Without a typing in kg from 1 kg, in mg under 0.1 g, else in g.
 */
export function massParts(mass: KeptMass): EstimatedParts {
  const unit = typedUnit(mass.entered) ?? usualUnit(mass.g);
  const gramsPerUnit = findUnit(unit)?.factor ?? 1;
  const [value, plusMinus] = [mass.g, mass.uncertaintyG].map((g) =>
    Number((g / gramsPerUnit).toPrecision(figuresKept)),
  );
  const decimals = Math.max(decimalsOf(value), decimalsOf(plusMinus));
  return { value: formatNumber(value, { decimals }), plusMinus: formatNumber(plusMinus, { decimals }), unit };
}

/** A mass as one text, never broken over lines. */
export function formatMass(mass: KeptMass): string {
  const { value, plusMinus, unit } = massParts(mass);
  return `${value}\u00A0±\u00A0${plusMinus}\u00A0${unit}`;
}

function typedUnit(entered: string | null): string | undefined {
  return /(kg|mg|g)\b/i.exec(entered ?? '')?.[1]?.toLowerCase();
}

function usualUnit(massG: number): string {
  if (massG >= gramsPerKilogram) return 'kg';
  return massG < 100 * gramsPerMilligram ? 'mg' : 'g';
}

function decimalsOf(value: number): number {
  const [mantissa = '', power = '0'] = value.toExponential().split('e');
  return Math.max(0, (mantissa.split('.')[1]?.length ?? 0) - Number(power));
}
