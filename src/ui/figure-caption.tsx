import type { ReactNode } from 'react';

/** "Fig. 2" in italic, then what is seen, then scale and its source. */
export function FigureCaption({ number, children }: { number?: ReactNode; children: ReactNode }) {
  return (
    <figcaption className="figure-caption">
      {number ? <b>{number}</b> : null}
      {children}
    </figcaption>
  );
}
