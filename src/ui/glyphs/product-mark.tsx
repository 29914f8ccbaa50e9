import { Glyph } from './glyph.tsx';

const fan =
  'M12 20C11.4 15 6 8.2 2 9M12 20C12.6 15 18 8.2 22 9M12 20C11.35 14.4 8 6.2 3.6 5.4M12 20C12.65 14.4 16 6.2 20.4 5.4' +
  'M12 20C11.3 13.8 10.4 5.6 7 2.6M12 20C12.7 13.8 13.6 5.6 17 2.6M12 20V2.6';

/** The strokes of the mark alone, in a 24 × 24 field, for drawings that hold it (the seal). */
export function ProductMarkStrokes() {
  return (
    <>
      <path d={fan} stroke="currentColor" strokeWidth="1.5" strokeLinecap="round" />
      <circle cx="12" cy="20.4" r="2.1" fill="currentColor" />
    </>
  );
}

/** The mark of the product: hackle fanning from an origin, which is also a book seen open. 16 px and up. */
export function ProductMark({ size = 24 }: { size?: number }) {
  return (
    <Glyph width={size} height={size} viewBox="0 0 24 24">
      <ProductMarkStrokes />
    </Glyph>
  );
}
