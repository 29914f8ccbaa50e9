import type { SourceStanding } from '#shared/vocabulary/constant-kinds.ts';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { StandingGlyph } from '#src/ui/glyphs/standing-glyph.tsx';

const standingOf = { 'own test': 'known', 'certificate or paper': 'told', assumed: 'assumed' } as const;

/** How well the source of a constant stands. */
export function SourceWord({ standing }: { standing: SourceStanding }) {
  return <GlyphWord glyph={<StandingGlyph standing={standingOf[standing]} />}>{standing}</GlyphWord>;
}
