/** Constants of a material, the unit each is kept in, and the mirror boundary it belongs to where it has one. */
export const constantKindTable = {
  toughness: { word: 'fracture toughness', symbol: 'K_Ic', unit: 'MPa√m' },
  'mirror constant, inner': { word: 'mirror constant, inner boundary', symbol: 'A_i', unit: 'MPa√m' },
  'mirror constant, outer': { word: 'mirror constant, outer boundary', symbol: 'A_o', unit: 'MPa√m' },
  'mirror constant, branching': { word: 'mirror constant, branching', symbol: 'A_b', unit: 'MPa√m' },
  'elastic modulus': { word: 'elastic modulus', symbol: 'E', unit: 'GPa' },
  'Poisson ratio': { word: "Poisson's ratio", symbol: 'ν', unit: '1' },
  'slow growth exponent': { word: 'slow growth exponent', symbol: 'n', unit: '1' },
} as const;
export type ConstantKind = keyof typeof constantKindTable;
export const constantKinds = Object.keys(constantKindTable) as [ConstantKind, ...ConstantKind[]];

export const materialFamilies = [
  'alumina',
  'zirconia',
  'silicon nitride',
  'silicon carbide',
  'glass, annealed',
  'glass, tempered',
  'glass ceramic',
  'porcelain',
  'hardmetal',
  'other',
] as const;
export type MaterialFamily = (typeof materialFamilies)[number];

/** Where a constant comes from: own test, another's paper or certificate, or assumed. */
export const sourceStandings = ['own test', 'certificate or paper', 'assumed'] as const;
export type SourceStanding = (typeof sourceStandings)[number];
