/** Identity of an origin: code as in ASTM C1322 practice, plain word, glyph family and distribution. */
export const originCodeTable = {
  A: { word: 'agglomerate', glyph: 'agglomerate', distribution: 'volume' },
  CI: { word: 'compositional inhomogeneity', glyph: 'agglomerate', distribution: 'volume' },
  CK: { word: 'crack', glyph: 'crack', distribution: 'volume' },
  I: { word: 'inclusion', glyph: 'inclusion', distribution: 'volume' },
  LG: { word: 'large grain', glyph: 'large grain', distribution: 'volume' },
  P: { word: 'pore', glyph: 'pore', distribution: 'volume' },
  PR: { word: 'porous region', glyph: 'pore', distribution: 'volume' },
  PS: { word: 'porous seam', glyph: 'pore', distribution: 'volume' },
  HD: { word: 'handling damage', glyph: 'handling damage', distribution: 'surface' },
  MD: { word: 'machining damage', glyph: 'machining damage', distribution: 'surface' },
  PT: { word: 'pit', glyph: 'pit', distribution: 'surface' },
  SV: { word: 'surface void', glyph: 'pore', distribution: 'surface' },
  '?': { word: 'unidentified', glyph: 'unidentified', distribution: 'not known' },
  '–': { word: 'not examined', glyph: 'not examined', distribution: 'not known' },
} as const;
export type OriginCode = keyof typeof originCodeTable;
export const originCodes = Object.keys(originCodeTable) as [OriginCode, ...OriginCode[]];
