import type { ReactNode } from 'react';
import { Glyph } from './glyph.tsx';

export type MarkShape =
  | 'origin'
  | 'flaw outline'
  | 'mirror'
  | 'mist'
  | 'hackle'
  | 'wallner line'
  | 'arrest line'
  | 'compression curl'
  | 'length'
  | 'note';

const samples: Record<MarkShape, ReactNode> = {
  origin: (
    <g stroke="var(--m-origin)" strokeWidth="1.8">
      <circle cx="11" cy="8" r="4.5" />
      <path d="M2 8h6M14 8h6M11 0v5" />
    </g>
  ),
  'flaw outline': (
    <>
      <path d="M2 14A9 11 0 0 1 20 14" stroke="var(--m-flaw)" strokeWidth="1.8" />
      <path d="M0 12h4v4H0zM18 12h4v4h-4zM9 1h4v4H9z" fill="var(--m-flaw)" />
    </>
  ),
  mirror: (
    <g stroke="var(--m-mirror)">
      <path d="M1 8H21" strokeWidth="2.2" strokeDasharray="7 3.5" />
      <path d="M1 3.5V12.5M21 3.5V12.5" strokeWidth="1.8" />
    </g>
  ),
  mist: <path d="M2 8H21" stroke="var(--m-mist)" strokeWidth="2.8" strokeDasharray=".1 4.6" strokeLinecap="round" />,
  hackle: <path d="M1 8H19M14 3.5L20 8 14 12.5" stroke="var(--m-hackle)" strokeWidth="1.9" />,
  'wallner line': (
    <g stroke="var(--m-wallner)">
      <path d="M4 8H18" strokeWidth="2" strokeDasharray="5 2 1 2" />
      <circle cx="2.5" cy="8" r="2" strokeWidth="1.4" />
      <circle cx="19.5" cy="8" r="2" strokeWidth="1.4" />
    </g>
  ),
  'arrest line': (
    <>
      <path d="M1 8H21" stroke="#fff" strokeWidth="5.4" />
      <path d="M1 8H21" stroke="var(--m-arrest)" strokeWidth="2.4" />
    </>
  ),
  'compression curl': (
    <>
      <path d="M1 8H20" stroke="var(--m-curl)" strokeWidth="1.9" strokeDasharray="3.5 2.5" />
      <path d="M20 4v8l-4-4z" fill="var(--m-curl)" />
    </>
  ),
  length: <path d="M2 8H20M2 3.5V12.5M20 3.5V12.5" stroke="#fff" strokeWidth="1.6" />,
  note: (
    <>
      <circle cx="11" cy="8" r="6" stroke="#fff" strokeWidth="1.4" />
      <text x="11" y="12.4" fontSize="12" fontWeight="600" textAnchor="middle" fill="#fff">
        n
      </text>
    </>
  ),
};

/** A sample of a mark's stroke for a tool or a list. On paper it stands on a small dark plate, as on an image. */
export function MarkGlyph({ shape, onPlate = false }: { shape: MarkShape; onPlate?: boolean }) {
  if (!onPlate) {
    return (
      <Glyph width={22} height={16}>
        {samples[shape]}
      </Glyph>
    );
  }
  return (
    <Glyph width={30} height={22} viewBox="-4 -3 30 22">
      <rect x="-4" y="-3" width="30" height="22" rx="2" fill="var(--plate)" />
      {samples[shape]}
    </Glyph>
  );
}
