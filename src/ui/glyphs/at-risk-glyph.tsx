import type { ReactNode } from 'react';
import { Glyph } from './glyph.tsx';

export type AtRiskShape = 'held' | 'inspected' | 'released' | 'unreachable' | 'open';

const bracket = { stroke: 'currentColor', strokeWidth: 1.3 };

const shapes: Record<AtRiskShape, ReactNode> = {
  held: (
    <>
      <rect x="6.6" y="2" width="4" height="12" fill="currentColor" />
      <path d="M4.4 1H1.6V15H4.4M12.8 1H15.6V15H12.8" {...bracket} />
    </>
  ),
  inspected: (
    <>
      <rect x="6.6" y="7" width="4" height="8" fill="currentColor" />
      <circle cx="8.6" cy="5" r="4" fill="var(--sheet)" stroke="currentColor" strokeWidth="1.4" />
      <circle cx="8.6" cy="5" r="1.2" fill="currentColor" />
    </>
  ),
  released: (
    <>
      <path d="M4.4 1H1.6V15H4.4" {...bracket} />
      <rect x="10.4" y="2" width="4" height="12" fill="currentColor" />
      <path d="M4 8H8.6" stroke="currentColor" strokeWidth="1.2" />
    </>
  ),
  unreachable: <path d="M8.6 1.6V14.6" stroke="currentColor" strokeWidth="3.4" strokeDasharray="2 2.2" />,
  open: <rect x="7.1" y="2.5" width="3" height="11" stroke="currentColor" strokeWidth="1.2" />,
};

const colour: Record<AtRiskShape, string> = {
  held: 'text-celadon',
  inspected: 'text-celadon',
  released: 'text-ink-2',
  unreachable: 'text-ochre',
  open: 'text-iron',
};

/** The answer for one piece at risk: in brackets, under a ring, out of its bracket, dotted, or open and hollow. */
export function AtRiskGlyph({ answer }: { answer: AtRiskShape }) {
  return (
    <Glyph width={17} height={16} className={colour[answer]}>
      {shapes[answer]}
    </Glyph>
  );
}
