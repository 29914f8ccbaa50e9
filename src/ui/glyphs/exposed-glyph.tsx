import { Glyph } from './glyph.tsx';

/** A roof broken over a standing figure, iron. Beside "Someone may be exposed now". */
export function ExposedGlyph() {
  return (
    <Glyph width={22} height={20} className="text-iron">
      <path
        d="M2 9.5A9 9 0 0 1 9.6 2.2M13.6 2.6A9 9 0 0 1 20 9.5"
        stroke="currentColor"
        strokeWidth="2"
        strokeLinecap="round"
      />
      <circle cx="11" cy="9" r="2.1" fill="currentColor" />
      <path d="M11 12V18.6" stroke="currentColor" strokeWidth="2.6" strokeLinecap="round" />
    </Glyph>
  );
}
