import type { ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

type SpreadProps = {
  children: ReactNode;
  /** The proportion of its pages: 46:54, 48:52 for a large figure, halves, a narrow left page, one page. */
  shape?: 'usual' | 'figure' | 'even' | 'findings' | 'single';
};

/** Two sheets sharing one gutter: left what was seen, right what was reasoned. One column under 1100 px. */
export function Spread({ children, shape = 'usual' }: SpreadProps) {
  return <div className={joinClasses('spread', shape !== 'usual' && `is-${shape}`)}>{children}</div>;
}
