import type { ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

type MarginNoteProps = { title?: ReactNode; stale?: boolean; children?: ReactNode; className?: string };

/** A note in the margin, top-aligned to the line it speaks of. */
export function MarginNote({ title, stale, children, className }: MarginNoteProps) {
  return (
    <aside className={joinClasses('margin-note', stale && 'is-stale', className)}>
      {title ? <p className="margin-title">{title}</p> : null}
      {children}
    </aside>
  );
}
