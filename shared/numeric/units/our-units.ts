/** What a number measures. */
export type UnitKind = 'length' | 'force' | 'stress' | 'toughness' | 'mass' | 'dimensionless';

/** The units the numbers are held in; everything typed is turned into one of these at the door. */
export type OurUnit = 'mm' | 'N' | 'MPa' | 'MPa√m' | 'g' | '1';

export const ourUnitOf: Readonly<Record<UnitKind, OurUnit>> = {
  length: 'mm',
  force: 'N',
  stress: 'MPa',
  toughness: 'MPa√m',
  mass: 'g',
  dimensionless: '1',
};
