import type { ReactNode } from 'react';
import { Glyph } from './glyph.tsx';

export type BearingShape = 'for' | 'against' | 'neutral' | 'not yet';

const beam = <path d="M1 3.2H19" stroke="currentColor" strokeWidth="2" />;
const bareBeam = <path d="M1 3.2H19" stroke="currentColor" strokeWidth="1.2" />;

const colour: Record<BearingShape, string> = {
  for: 'text-celadon',
  against: 'text-iron',
  neutral: 'text-ink-3',
  'not yet': 'text-ochre',
};

function drawing(bearing: BearingShape, heavy: boolean): ReactNode {
  if (bearing === 'neutral') return bareBeam;
  if (bearing === 'not yet') {
    return (
      <>
        {bareBeam}
        <path d="M10 6.2V13.4" stroke="currentColor" strokeWidth="2.4" strokeDasharray="2.2 2" />
      </>
    );
  }
  if (bearing === 'against') {
    return heavy ? (
      <path d="M1 3.2L8.4 11.4M19 3.2L11.6 11.4" stroke="currentColor" strokeWidth="2.2" />
    ) : (
      <path d="M1 3.2L8.6 6.4M19 3.2L11.4 6.4" stroke="currentColor" strokeWidth="2" />
    );
  }
  return (
    <>
      {beam}
      <path d={heavy ? 'M4.6 4.4h3v9.2h-3zM12.4 4.4h3v9.2h-3z' : 'M8.5 4.4h3v9.2h-3z'} fill="currentColor" />
    </>
  );
}

/** What evidence does to a cause: the cause is a beam, for props it, against breaks it, heavy evidence does more. */
export function BearingGlyph({ bearing, heavy = false }: { bearing: BearingShape; heavy?: boolean }) {
  return (
    <Glyph width={20} height={16} className={colour[bearing]}>
      {drawing(bearing, heavy)}
      <path d="M3 14.6H17" stroke="currentColor" opacity={0.6} />
    </Glyph>
  );
}
