import { Glyph } from './glyph.tsx';

export type ListedShape = 'same' | 'changed' | 'missing' | 'added';

const upper = 'M2 4.5H16';
const lower = 'M2 9.5H16';
const bent = 'M2 10.5L7.5 8.5 10.5 11 16 8';
const dotted = '2 2.6';

/** A thing against its list: two strokes alike, the lower bent, the lower dotted, or the upper dotted. */
export function ListedGlyph({ listed }: { listed: ListedShape }) {
  return (
    <Glyph width={18} height={14} className={listed === 'same' ? 'text-celadon' : 'text-iron'}>
      <path d={upper} stroke="currentColor" strokeWidth="2" strokeDasharray={listed === 'added' ? dotted : undefined} />
      <path
        d={listed === 'changed' ? bent : lower}
        stroke="currentColor"
        strokeWidth="2"
        strokeDasharray={listed === 'missing' ? dotted : undefined}
      />
    </Glyph>
  );
}
