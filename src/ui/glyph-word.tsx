import type { ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

type GlyphWordProps = { glyph: ReactNode; children: ReactNode; className?: string };

/** A glyph and its word: neither carries the meaning alone. */
export function GlyphWord({ glyph, children, className }: GlyphWordProps) {
  return (
    <span className={joinClasses('glyph-word', className)}>
      {glyph}
      <span>{children}</span>
    </span>
  );
}
