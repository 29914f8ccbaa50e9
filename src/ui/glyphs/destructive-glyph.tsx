import { Glyph } from './glyph.tsx';

/** A block cut through, one half gone hollow, iron. Beside what is lost: "destroys 3 mm". */
export function DestructiveGlyph() {
  return (
    <Glyph width={17} height={13} className="text-iron">
      <path d="M1 2.5H8.4L5.2 10.5H1Z" fill="currentColor" />
      <path d="M11.4 2.5H16V10.5H8.2Z" stroke="currentColor" strokeWidth="1.3" />
    </Glyph>
  );
}
