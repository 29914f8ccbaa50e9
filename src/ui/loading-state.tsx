import type { ReactNode } from 'react';
import { useLate } from './use-late.ts';

type LoadingStateProps = {
  /** "Reading estimates…" */
  words: string;
  /** The page's rules and heads, which stand at once. */
  children?: ReactNode;
};

/** Nothing for 300 ms, then words. Nothing shimmers. */
export function LoadingState({ words, children }: LoadingStateProps) {
  const late = useLate();
  return (
    <div aria-busy>
      {children}
      <p role="status" className="min-h-[21px] font-serif text-m text-ink-2 italic">
        {late ? words : ''}
      </p>
    </div>
  );
}
