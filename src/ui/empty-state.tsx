import type { ReactNode } from 'react';
import { CornerTicks } from './corner-ticks.tsx';

type EmptyStateProps = {
  /** A drawn hint of what belongs here. */
  hint?: ReactNode;
  /** The page's first heading, where it has none. */
  title?: ReactNode;
  /** One sentence that says what to do next. */
  children: ReactNode;
  /** One button, and words beside it. */
  acts?: ReactNode;
  help?: ReactNode;
};

/** A place with nothing in it yet, or nothing one may see. */
export function EmptyState({ hint, title, children, acts, help }: EmptyStateProps) {
  return (
    <div className="flex flex-col items-center px-5 pt-[22px] pb-4 text-center narrow:px-0">
      <CornerTicks>{hint ?? <EmptyLine />}</CornerTicks>
      {title ? <h1 className="mt-3 text-h4">{title}</h1> : null}
      <p className={title ? 'mt-1 max-w-[34em]' : 'mt-4 max-w-[26em] font-serif text-[19px]/[1.4]'}>{children}</p>
      {acts ? <div className="acts mt-[14px] justify-center">{acts}</div> : null}
      {help ? <p className="mt-3 text-s text-ink-2">{help}</p> : null}
    </div>
  );
}

function EmptyLine() {
  return (
    <svg width="32" height="2" viewBox="0 0 32 2" aria-hidden>
      <path d="M0 1H32" stroke="var(--control)" strokeWidth="1.3" strokeDasharray="4 4" />
    </svg>
  );
}
