import type { ReactNode } from 'react';
import { Glyph } from './glyph.tsx';
import { originColour, type OriginShape } from './origin-shape.ts';

const line = { stroke: 'currentColor', strokeWidth: 2 };

const shapes: Record<OriginShape, ReactNode> = {
  pore: <circle r="4.4" fill="var(--sheet)" stroke="currentColor" strokeWidth="1.9" />,
  agglomerate: (
    <g fill="currentColor">
      <circle cx="-2.3" cy="1.7" r="3" />
      <circle cx="2.4" cy="1.9" r="3" />
      <circle cy="-2.2" r="3" />
    </g>
  ),
  inclusion: <path d="M0-5.6L5.6 0 0 5.6-5.6 0Z" fill="currentColor" />,
  'machining damage': <path d="M-5.8-2.9H5.8A5.8 6.8 0 0 1-5.8-2.9Z" fill="currentColor" />,
  'edge damage': <path d="M-5-5V5H5Z" fill="currentColor" />,
  'contact damage': <path d="M-5.4 4.6L-1.5-3.6H1.5L5.4 4.6" {...line} />,
  crack: <path d="M-5.4 4.6L-1.5-3.6H1.5L5.4 4.6M-6 3L6-4.4" {...line} strokeWidth="1.8" />,
  'large grain': (
    <path d="M-4.6-2.6L1.2-5 5-1.2 3.2 4.4-3.4 4.8Z" fill="var(--sheet)" stroke="currentColor" strokeWidth="1.8" />
  ),
  pit: <path d="M-6-3.6H-3.8A3.8 6.4 0 0 0 3.8-3.6H6" {...line} />,
  'own term': <rect x="-4.4" y="-4.4" width="8.8" height="8.8" fill="currentColor" />,
  unidentified: <circle r="4.4" stroke="currentColor" strokeWidth="1.5" strokeDasharray="3.4 2.1" />,
  'not examined': (
    <circle r="4.4" stroke="currentColor" strokeWidth="1.8" strokeDasharray="0.1 3.35" strokeLinecap="round" />
  ),
};

/** The shape alone, about its own middle in a field of ±7.5, for a point in a chart. */
export function OriginMark({ shape }: { shape: OriginShape }) {
  return <g color={originColour[shape]}>{shapes[shape]}</g>;
}

/** A type of origin as a small picture of the thing, beside its word. */
export function OriginGlyph({ shape, size = 15 }: { shape: OriginShape; size?: number }) {
  return (
    <Glyph width={size} height={size} viewBox="-7.5 -7.5 15 15">
      <OriginMark shape={shape} />
    </Glyph>
  );
}
