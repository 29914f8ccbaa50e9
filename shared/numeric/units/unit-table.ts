import type { UnitKind } from './our-units.ts';

export type Unit = {
  /** As shown. */
  readonly name: string;
  readonly kind: UnitKind;
  /** How many of our unit of that kind one of these is. */
  readonly factor: number;
  /** Every accepted spelling, the shown one among them; capitals count, since mPa is not MPa. */
  readonly spellings: readonly string[];
};

// Exact by definition: international inch (1959), standard gravity (CGPM 1901), avoirdupois pound (1959).
const mmPerInch = 25.4;
const newtonPerKgf = 9.80665;
const kgPerPound = 0.45359237;
const newtonPerLbf = newtonPerKgf * kgPerPound;
const mpaPerPsi = newtonPerLbf / mmPerInch ** 2;
const rootMetrePerRootInch = Math.sqrt(mmPerInch / 1000);
const rootMetrePerRootMm = Math.sqrt(1 / 1000);

/** Units that can be typed. The factors are exact, or follow from exact ones by arithmetic. */
export const unitTable: readonly Unit[] = [
  { name: 'mm', kind: 'length', factor: 1, spellings: ['mm', 'MM', 'millimetre', 'millimetres', 'millimeter'] },
  { name: 'µm', kind: 'length', factor: 1e-3, spellings: ['µm', 'μm', 'um', 'UM', 'micron', 'microns', 'micrometre'] },
  { name: 'nm', kind: 'length', factor: 1e-6, spellings: ['nm', 'NM', 'nanometre'] },
  { name: 'cm', kind: 'length', factor: 10, spellings: ['cm', 'CM', 'centimetre'] },
  { name: 'm', kind: 'length', factor: 1000, spellings: ['m', 'metre', 'metres', 'meter'] },
  {
    name: 'in',
    kind: 'length',
    factor: mmPerInch,
    spellings: ['in', 'in.', 'IN', 'inch', 'inches', 'Inch', '"', '″', '”'],
  },
  { name: 'mil', kind: 'length', factor: mmPerInch / 1000, spellings: ['mil', 'mils', 'thou'] },

  { name: 'N', kind: 'force', factor: 1, spellings: ['N', 'newton', 'newtons'] },
  { name: 'kN', kind: 'force', factor: 1000, spellings: ['kN', 'KN'] },
  { name: 'lbf', kind: 'force', factor: newtonPerLbf, spellings: ['lbf', 'LBF', 'Lbf'] },
  { name: 'kgf', kind: 'force', factor: newtonPerKgf, spellings: ['kgf', 'KGF', 'kp'] },
  { name: 'gf', kind: 'force', factor: newtonPerKgf / 1000, spellings: ['gf'] },

  { name: 'MPa', kind: 'stress', factor: 1, spellings: ['MPa', 'Mpa', 'MPA', 'N/mm²', 'N/mm2', 'N/mm^2'] },
  { name: 'Pa', kind: 'stress', factor: 1e-6, spellings: ['Pa'] },
  { name: 'kPa', kind: 'stress', factor: 1e-3, spellings: ['kPa', 'KPa'] },
  { name: 'GPa', kind: 'stress', factor: 1000, spellings: ['GPa', 'Gpa', 'GPA'] },
  { name: 'psi', kind: 'stress', factor: mpaPerPsi, spellings: ['psi', 'PSI', 'lbf/in²', 'lbf/in2', 'lbf/in^2'] },
  { name: 'ksi', kind: 'stress', factor: mpaPerPsi * 1000, spellings: ['ksi', 'KSI'] },
  { name: 'bar', kind: 'stress', factor: 0.1, spellings: ['bar'] },
  {
    name: 'kgf/mm²',
    kind: 'stress',
    factor: newtonPerKgf,
    spellings: ['kgf/mm²', 'kgf/mm2', 'kgf/mm^2', 'kp/mm²', 'kp/mm2'],
  },

  { name: 'MPa m½', kind: 'toughness', factor: 1, spellings: rootSpellings('MPa', 'm') },
  {
    name: 'ksi in½',
    kind: 'toughness',
    factor: mpaPerPsi * 1000 * rootMetrePerRootInch,
    spellings: rootSpellings('ksi', 'in'),
  },
  {
    name: 'N/mm^1.5',
    kind: 'toughness',
    factor: rootMetrePerRootMm,
    spellings: ['N/mm^1.5', 'N/mm1.5', 'N/mm^(3/2)', 'N/mm^3/2', 'N mm^-1.5', ...rootSpellings('MPa', 'mm')],
  },

  { name: 'g', kind: 'mass', factor: 1, spellings: ['g', 'gram', 'grams', 'gramme'] },
  { name: 'kg', kind: 'mass', factor: 1000, spellings: ['kg', 'KG', 'Kg', 'kilogram', 'kilograms'] },
  { name: 'mg', kind: 'mass', factor: 1e-3, spellings: ['mg', 'milligram', 'milligrams'] },

  { name: '1', kind: 'dimensionless', factor: 1, spellings: ['1'] },
  { name: '%', kind: 'dimensionless', factor: 0.01, spellings: ['%'] },
];

/** All the ways people write a stress times the root of a length. Spaces are taken out before comparing. */
function rootSpellings(stress: string, length: string): string[] {
  const roots = [
    `√${length}`,
    `√(${length})`,
    `sqrt(${length})`,
    `sqrt${length}`,
    `${length}½`,
    `${length}^½`,
    `${length}^0.5`,
    `${length}^(1/2)`,
    `${length}^1/2`,
    `${length}0.5`,
    `${length}1/2`,
  ];
  return ['', '*', '·', '.', '×'].flatMap((times) => roots.map((root) => `${stress}${times}${root}`));
}

/** The unit of that spelling, spaces aside, or nothing. */
export function findUnit(spelling: string): Unit | undefined {
  const tight = spelling.replace(/\s+/g, '');
  return unitTable.find((unit) => unit.spellings.includes(tight));
}

/** The shown names of the units of a kind, in the order of the table. */
export function unitNamesOf(kind: UnitKind): string[] {
  return unitTable.filter((unit) => unit.kind === kind).map((unit) => unit.name);
}
