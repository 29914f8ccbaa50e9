import type { ReactNode } from 'react';
import { Glyph } from './glyph.tsx';

export type PieceShape = 'part' | 'fragment' | 'replica' | 'section' | 'missing';

const outline = 'M2.2 6L6 1.8 12.2 2.6 14.4 8.2 9.6 13.6 3.4 11.6Z';
const thin = { stroke: 'currentColor', strokeWidth: 1.2 };

const shapes: Record<PieceShape, ReactNode> = {
  part: (
    <>
      <path d={outline} stroke="currentColor" strokeWidth="1.4" strokeLinejoin="round" />
      <path d="M5.2 1.8L8 7 6 12.6M8 7L14 7.4" stroke="currentColor" strokeWidth="1.1" />
    </>
  ),
  fragment: <path d={outline} fill="currentColor" />,
  replica: (
    <>
      <path d={outline} {...thin} />
      <path d="M4.4 6.6L7 4.2 10.8 4.7 12 8 9 11 5.2 9.9Z" {...thin} />
    </>
  ),
  section: (
    <>
      <path d="M1.6 12.6V5.2L5 2V9.4Z" fill="currentColor" />
      <path d="M7.4 12.6V5.2L10.8 2V9.4Z" {...thin} strokeDasharray="2 1.6" />
      <path d="M12.4 12.6V5.2L15 3" {...thin} strokeDasharray="2 1.6" />
    </>
  ),
  missing: <path d={outline} stroke="currentColor" strokeWidth="1.3" strokeDasharray="2.4 1.8" />,
};

/** An uneven polygon: the part cracked, a fragment full, a replica doubled, a section a slice, what is missing dashed. */
export function PieceGlyph({ piece }: { piece: PieceShape }) {
  return (
    <Glyph width={16} height={15}>
      {shapes[piece]}
    </Glyph>
  );
}
