import type { CaseState } from '#shared/vocabulary/case-states.ts';
import { formatShortDay } from '#shared/wording/dates.ts';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { StateGlyph } from '#src/ui/glyphs/state-glyph.tsx';

type StateWordProps = { state: CaseState; holdUntil: string | null };

/** How far a case has come, as glyph and word; a case on hold says until when. */
export function StateWord({ state, holdUntil }: StateWordProps) {
  if (holdUntil === null || state === 'closed' || state === 'withdrawn')
    return <GlyphWord glyph={<StateGlyph state={state} />}>{state}</GlyphWord>;
  return (
    <GlyphWord glyph={<StateGlyph state="on hold" cameTo={state} />}>on hold to {formatShortDay(holdUntil)}</GlyphWord>
  );
}
