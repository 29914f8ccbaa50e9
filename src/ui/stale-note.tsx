import type { ReactNode } from 'react';
import { StaleGlyph } from './glyphs/stale-glyph.tsx';
import { MarginNote } from './margin-note.tsx';

type StaleNoteProps = {
  /** "3 March". */
  since: ReactNode;
  /** What changed, from what to what, what it would become, and whether the verdict would move. */
  children: ReactNode;
  /** Two ways out: take the new, or keep the old and say why. */
  acts?: ReactNode;
};

/** The margin note beside a value that rests on something changed since. */
export function StaleNote({ since, children, acts }: StaleNoteProps) {
  return (
    <MarginNote
      stale
      title={
        <>
          <StaleGlyph />
          Stale since {since}
        </>
      }
    >
      {children}
      {acts ? <div className="mt-2 flex flex-col items-start gap-[6px]">{acts}</div> : null}
    </MarginNote>
  );
}
