import type { OurUnit } from '../numeric/units/our-units.ts';

// Units that need more than plain letters, as the reference values spell them.
const spelled: Partial<Record<OurUnit, string>> = {
  'MPa√m': 'MPa*sqrt(m)',
  '√m': 'sqrt(m)',
  'MPa²': 'MPa^2',
  'MPa²·s': 'MPa^2*s',
  '°': 'deg',
  'K⁻¹': '1/K',
  'W/(m²·K)': 'W/(m^2 K)',
  'W/(m·K)': 'W/(m K)',
  'mm⁴': 'mm^4',
  'J/m²': 'J/m^2',
};

/** A unit in plain letters; words and answers of yes or no have none. */
export function plainUnit(unit: OurUnit | null, value: unknown): string {
  if (unit === null) return typeof value === 'boolean' ? 'boolean' : 'code';
  return spelled[unit] ?? unit;
}

/** "MPa/mm": how much of one per one of the other. */
export function plainRate(over: OurUnit, under: OurUnit): string {
  const divisor = plainUnit(under, 0);
  return `${plainUnit(over, 0)}/${/[*/^ ]/.test(divisor) ? `(${divisor})` : divisor}`;
}
