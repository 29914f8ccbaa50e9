import type { ReactNode } from 'react';

/** The passing notice in a page's head, "Kept 14:12", with Undo beside it while it can be undone. */
export function Kept({ children, undo }: { children: ReactNode; undo?: () => void }) {
  return (
    <span className="inline-flex items-baseline gap-3 text-s text-ink-3">
      <span aria-live="polite">{children}</span>
      {undo ? (
        <button type="button" className="text-cobalt underline underline-offset-[3px]" onClick={undo}>
          Undo
        </button>
      ) : null}
    </span>
  );
}
