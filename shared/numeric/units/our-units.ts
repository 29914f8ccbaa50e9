/** What a number measures. */
export type UnitKind =
  | 'length'
  | 'force'
  | 'stress'
  | 'toughness'
  | 'mass'
  | 'dimensionless'
  | 'angle'
  | 'modulus'
  | 'speed'
  | 'stiffness'
  | 'compliance'
  | 'stressRate'
  | 'stressGradient'
  | 'time'
  | 'temperatureDifference'
  | 'expansion'
  | 'heatTransfer'
  | 'conductivity'
  | 'growthConstant'
  | 'stressSquared';

/** The units the numbers are held in; everything typed is turned into one of these at the door. */
export const ourUnits = [
  'mm',
  'N',
  'MPa',
  'MPa√m',
  'g',
  '1',
  '°',
  'GPa',
  'mm/min',
  'N/mm',
  'mm/N',
  'MPa/s',
  'MPa/mm',
  's',
  'K',
  'K⁻¹',
  'W/(m²·K)',
  'W/(m·K)',
  'MPa²·s',
  'MPa²',
  // from here on: those that nobody types and only a method gives
  'mm⁴',
  '1/s',
  'mJ',
  'J/m²',
  '√m',
] as const;
export type OurUnit = (typeof ourUnits)[number];

export const ourUnitOf: Readonly<Record<UnitKind, OurUnit>> = {
  length: 'mm',
  force: 'N',
  stress: 'MPa',
  toughness: 'MPa√m',
  mass: 'g',
  dimensionless: '1',
  angle: '°',
  modulus: 'GPa',
  speed: 'mm/min',
  stiffness: 'N/mm',
  compliance: 'mm/N',
  stressRate: 'MPa/s',
  stressGradient: 'MPa/mm',
  time: 's',
  temperatureDifference: 'K',
  expansion: 'K⁻¹',
  heatTransfer: 'W/(m²·K)',
  conductivity: 'W/(m·K)',
  growthConstant: 'MPa²·s',
  stressSquared: 'MPa²',
};
