import type { ReactNode } from 'react';
import { Note } from './note.tsx';

type ErrorStateProps = {
  /** What failed, and where. */
  what: ReactNode;
  why?: ReactNode;
  /** What still holds: "Nothing was lost: the draft is kept." */
  holds?: ReactNode;
  /** The way on: one button, one link. */
  acts?: ReactNode;
  /** For support. */
  reference?: string;
};

/** An error in the page. */
export function ErrorState({ what, why, holds, acts, reference }: ErrorStateProps) {
  return (
    <Note tone="iron" alert lead={what} acts={acts}>
      {why}
      {holds ? <p className="mt-1">{holds}</p> : null}
      {reference ? (
        <p className="mt-1 text-s text-ink-2">
          Reference <span className="mono">{reference}</span>
        </p>
      ) : null}
    </Note>
  );
}
