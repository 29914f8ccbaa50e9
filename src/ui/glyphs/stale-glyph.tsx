import { Glyph } from './glyph.tsx';

/** A sheet with its corner turned down, iron. Beside the word "stale". */
export function StaleGlyph() {
  return (
    <Glyph width={13} height={14} className="text-iron">
      <path d="M1.2.8H7.6L12 5.2V13.2H1.2Z" stroke="currentColor" strokeWidth="1.3" strokeLinejoin="round" />
      <path d="M7.4.8V5.4H12Z" fill="currentColor" stroke="currentColor" strokeLinejoin="round" />
    </Glyph>
  );
}
