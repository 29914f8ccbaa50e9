import { originCodeTable, type OriginCode } from '#shared/vocabulary/origin-codes.ts';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { OriginGlyph } from '#src/ui/glyphs/origin-glyph.tsx';
import { originShape } from '#src/ui/glyphs/origin-shape.ts';

/** The identity of an origin, as glyph and word. */
export function OriginWord({ code }: { code: OriginCode }) {
  return <GlyphWord glyph={<OriginGlyph shape={originShape(code)} />}>{originCodeTable[code].word}</GlyphWord>;
}
