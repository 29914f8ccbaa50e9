import type { ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

type NoteProps = {
  tone?: 'cobalt' | 'iron' | 'ochre' | 'celadon';
  /** The first sentence, bold. */
  lead?: ReactNode;
  children?: ReactNode;
  /** One button and one link. */
  acts?: ReactNode;
  /** An error to be spoken at once. Only errors are. */
  alert?: boolean;
  className?: string;
};

/** A message in the page: a bar and wash of its colour, what happened, what still holds, the way on. */
export function Note({ tone = 'cobalt', lead, children, acts, alert = false, className }: NoteProps) {
  return (
    <div className={joinClasses('note', `is-${tone}`, className)} role={alert ? 'alert' : undefined}>
      {lead ? <b>{lead} </b> : null}
      {children}
      {acts ? <div className="acts mt-2">{acts}</div> : null}
    </div>
  );
}
