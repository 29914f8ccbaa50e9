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
const kelvinPerFahrenheit = 5 / 9;
const rootMetrePerRootInch = Math.sqrt(mmPerInch / 1000);
const rootMetrePerRootMm = Math.sqrt(1 / 1000);
const degreesPerRadian = 180 / Math.PI;
const secondsPerMinute = 60;

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

  { name: 'MPa/s', kind: 'stressRate', factor: 1, spellings: ['MPa/s', 'MPas⁻¹', 'MPas^-1', 'N/(mm²s)'] },
  { name: 'psi/s', kind: 'stressRate', factor: mpaPerPsi, spellings: ['psi/s'] },
  { name: 'MPa/mm', kind: 'stressGradient', factor: 1, spellings: ['MPa/mm', 'N/mm³', 'N/mm3', 'N/mm^3'] },

  { name: 's', kind: 'time', factor: 1, spellings: ['s', 'sec', 'second', 'seconds'] },
  { name: 'min', kind: 'time', factor: 60, spellings: ['min', 'minute', 'minutes'] },
  { name: 'h', kind: 'time', factor: 3600, spellings: ['h', 'hour', 'hours'] },
  { name: 'd', kind: 'time', factor: 86_400, spellings: ['d', 'day', 'days'] },

  { name: 'K', kind: 'temperatureDifference', factor: 1, spellings: ['K', '°C', 'C'] },
  { name: '°F', kind: 'temperatureDifference', factor: kelvinPerFahrenheit, spellings: ['°F', 'F'] },
  {
    name: 'K⁻¹',
    kind: 'expansion',
    factor: 1,
    spellings: ['K⁻¹', 'K^-1', '/K', '1/K', '/°C', '1/°C', '°C⁻¹', '°C^-1'],
  },
  {
    name: '10⁻⁶/K',
    kind: 'expansion',
    factor: 1e-6,
    spellings: ['10⁻⁶/K', '×10⁻⁶/K', '10^-6/K', 'ppm/K', 'ppm/°C', 'µm/(m·K)', 'μm/(m·K)'],
  },
  {
    name: 'W/(m²·K)',
    kind: 'heatTransfer',
    factor: 1,
    spellings: ['W/(m²·K)', 'W/(m²K)', 'W/m²K', 'W/m²/K', 'W/(m2K)', 'W/m2K', 'W/(m^2K)', 'Wm⁻²K⁻¹'],
  },
  {
    name: 'W/(m·K)',
    kind: 'conductivity',
    factor: 1,
    spellings: ['W/(m·K)', 'W/(mK)', 'W/mK', 'W/m/K', 'Wm⁻¹K⁻¹'],
  },
  { name: 'MPa²', kind: 'stressSquared', factor: 1, spellings: ['MPa²', 'MPa2', 'MPa^2'] },
  { name: 'MPa²·s', kind: 'growthConstant', factor: 1, spellings: ['MPa²·s', 'MPa²s', 'MPa2s', 'MPa^2s', 'MPa^2*s'] },

  { name: '°', kind: 'angle', factor: 1, spellings: ['°', 'º', 'deg', 'degree', 'degrees'] },
  { name: 'rad', kind: 'angle', factor: degreesPerRadian, spellings: ['rad', 'radian', 'radians'] },

  { name: 'GPa', kind: 'modulus', factor: 1, spellings: ['GPa', 'Gpa', 'GPA', 'kN/mm²', 'kN/mm2', 'kN/mm^2'] },
  { name: 'MPa', kind: 'modulus', factor: 1e-3, spellings: ['MPa', 'Mpa', 'MPA', 'N/mm²', 'N/mm2', 'N/mm^2'] },
  { name: 'ksi', kind: 'modulus', factor: mpaPerPsi, spellings: ['ksi', 'KSI'] },
  { name: 'Msi', kind: 'modulus', factor: mpaPerPsi * 1000, spellings: ['Msi', 'msi', 'MSI', 'Mpsi'] },

  { name: 'mm/min', kind: 'speed', factor: 1, spellings: ['mm/min', 'mm/minute'] },
  { name: 'mm/s', kind: 'speed', factor: secondsPerMinute, spellings: ['mm/s', 'mm/sec'] },
  { name: 'µm/s', kind: 'speed', factor: secondsPerMinute / 1000, spellings: ['µm/s', 'μm/s', 'um/s'] },
  { name: 'in/min', kind: 'speed', factor: mmPerInch, spellings: ['in/min', 'in./min', 'ipm'] },

  { name: 'N/mm', kind: 'stiffness', factor: 1, spellings: ['N/mm', 'kN/m'] },
  { name: 'kN/mm', kind: 'stiffness', factor: 1000, spellings: ['kN/mm', 'N/µm', 'N/μm', 'N/um'] },
  { name: 'lbf/in', kind: 'stiffness', factor: newtonPerLbf / mmPerInch, spellings: ['lbf/in', 'lbf/in.'] },

  { name: 'mm/N', kind: 'compliance', factor: 1, spellings: ['mm/N'] },
  { name: 'µm/N', kind: 'compliance', factor: 1e-3, spellings: ['µm/N', 'μm/N', 'um/N', 'mm/kN'] },
  { name: 'in/lbf', kind: 'compliance', factor: mmPerInch / newtonPerLbf, spellings: ['in/lbf', 'in./lbf'] },

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

/** The unit of that spelling, spaces aside, the one of the kind first where several kinds spell alike; or nothing. */
export function findUnit(spelling: string, kind?: UnitKind): Unit | undefined {
  const tight = spelling.replace(/\s+/g, '');
  const spelled = unitTable.filter((unit) => unit.spellings.includes(tight));
  return spelled.find((unit) => unit.kind === kind) ?? spelled.at(0);
}

/** The shown names of the units of a kind, in the order of the table. */
export function unitNamesOf(kind: UnitKind): string[] {
  return unitTable.filter((unit) => unit.kind === kind).map((unit) => unit.name);
}
