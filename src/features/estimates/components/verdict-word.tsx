import type { Verdict } from '#shared/vocabulary/estimate-lines.ts';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { VerdictGlyph, verdictColour } from '#src/ui/glyphs/verdict-glyph.tsx';

/** The verdict over a case's lines of evidence, as glyph and word. */
export function VerdictWord({ verdict }: { verdict: Verdict | undefined }) {
  if (!verdict) return <span className="text-ink-3">none yet</span>;
  return (
    <GlyphWord glyph={<VerdictGlyph verdict={verdict} />} className={verdictColour[verdict]}>
      {verdict}
    </GlyphWord>
  );
}
