import type { ReactNode } from 'react';

const corner = 'pointer-events-none absolute size-[21px] border-control';

/** The four corners of a place that waits to be filled. */
export function CornerTicks({ children }: { children: ReactNode }) {
  return (
    <div className="relative px-7 py-5">
      <i className={`${corner} top-0 left-0 border-t border-l`} />
      <i className={`${corner} top-0 right-0 border-t border-r`} />
      <i className={`${corner} bottom-0 left-0 border-b border-l`} />
      <i className={`${corner} right-0 bottom-0 border-r border-b`} />
      {children}
    </div>
  );
}
