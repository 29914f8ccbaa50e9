/** The small picture a type of origin has in charts, tables and print. */
export type OriginShape =
  | 'pore'
  | 'agglomerate'
  | 'inclusion'
  | 'machining damage'
  | 'edge damage'
  | 'contact damage'
  | 'crack'
  | 'large grain'
  | 'pit'
  | 'own term'
  | 'unidentified'
  | 'not examined';

const shapeOfCode: Record<string, OriginShape> = {
  P: 'pore',
  PR: 'pore',
  PS: 'pore',
  SV: 'pore',
  A: 'agglomerate',
  CI: 'agglomerate',
  I: 'inclusion',
  MD: 'machining damage',
  HD: 'contact damage',
  CK: 'crack',
  LG: 'large grain',
  PT: 'pit',
  '?': 'unidentified',
  '–': 'not examined',
};

/** The shape of an origin's code. Handling damage differs by place; a code outside the list is a laboratory's own term. */
export function originShape(code: string, atEdge = false): OriginShape {
  if (code === 'HD' && atEdge) return 'edge damage';
  return shapeOfCode[code] ?? 'own term';
}

/** The colour of each shape, as a custom property that follows the theme. */
export const originColour: Record<OriginShape, string> = {
  pore: 'var(--o-pore)',
  agglomerate: 'var(--o-agg)',
  inclusion: 'var(--o-inc)',
  'machining damage': 'var(--o-mach)',
  'edge damage': 'var(--o-chip)',
  'contact damage': 'var(--o-cont)',
  crack: 'var(--o-cont)',
  'large grain': 'var(--o-grain)',
  pit: 'var(--o-pit)',
  'own term': 'var(--ink-2)',
  unidentified: 'var(--ink-3)',
  'not examined': 'var(--ink-3)',
};
