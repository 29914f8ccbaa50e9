import type { ReactNode } from 'react';
import { GlyphWord } from './glyph-word.tsx';
import { StaleGlyph } from './glyphs/stale-glyph.tsx';

/** A row's remark in a table's margin column (`is-remark`): the word, and under it what changed and when. */
export function StaleRemark({ children }: { children: ReactNode }) {
  return (
    <span className="grid border-l-2 border-iron pl-[10px] text-s/[1.22] text-ink-2">
      <GlyphWord glyph={<StaleGlyph />} className="gap-[6px] font-semibold text-iron">
        stale
      </GlyphWord>
      {children}
    </span>
  );
}
