import { Glyph } from './glyph.tsx';
import { ProductMarkStrokes } from './product-mark.tsx';
import { sealStrokes } from './seal-strokes.ts';

export type SealFound = 'current' | 'superseded' | 'unknown';

type SealGlyphProps = {
  /** The digest of the sealed record, 64 hexadecimal digits; not needed for an unknown seal. */
  digestHex?: string;
  found?: SealFound;
  size?: number;
};

const colour: Record<SealFound, string> = { current: 'text-celadon', superseded: 'text-ochre', unknown: 'text-ink-3' };

/** A digest drawn round the product mark. An aid to the eye: the seal number is what is compared. */
export function SealGlyph({ digestHex, found = 'current', size = 58 }: SealGlyphProps) {
  return (
    <Glyph width={size} height={size} viewBox="2 2 96 96" className={colour[found]}>
      {found === 'unknown' || !digestHex ? (
        <circle
          cx="50"
          cy="50"
          r="32"
          stroke="currentColor"
          strokeWidth="3"
          strokeDasharray="0.1 9.9"
          strokeLinecap="round"
        />
      ) : (
        sealStrokes(digestHex).map((stroke, index) => (
          <line key={index} {...stroke} stroke="currentColor" strokeWidth="1.2" strokeLinecap="round" />
        ))
      )}
      <g transform="translate(37.5 37) scale(1.04)">
        <ProductMarkStrokes />
      </g>
      {found === 'superseded' ? <path d="M8 84L92 16" stroke="currentColor" strokeWidth="3" /> : null}
    </Glyph>
  );
}
