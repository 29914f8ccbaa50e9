import type { ReactNode } from 'react';

type WithMarginProps = { children: ReactNode; margin: ReactNode; className?: string };

/** Text with a margin column beside it; under 640 px the margin falls under the text it speaks of. */
export function WithMargin({ children, margin, className }: WithMarginProps) {
  return (
    <div className={`with-margin ${className ?? ''}`}>
      <div className="min-w-0">{children}</div>
      <div className="min-w-0">{margin}</div>
    </div>
  );
}
