import type { ComponentProps, KeyboardEvent, ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

type TableProps = Omit<ComponentProps<'table'>, 'className'> & {
  /** Names the table; read out, not drawn. */
  caption: ReactNode;
  /** The height and rule of its rows. */
  rows?: 'records' | 'casebook' | 'ledger' | 'inputs' | 'bench';
  /** Under 640 px each row becomes an entry; cells say their head in `data-word`. Left out, it scrolls sideways. */
  stacked?: boolean;
  /** The first cells hold pictures (`is-picture`). */
  pictures?: boolean;
  className?: string;
};

const keyTargets: Record<string, (here: number, last: number) => number> = {
  ArrowDown: (here, last) => Math.min(here + 1, last),
  ArrowUp: (here) => Math.max(here - 1, 0),
  Home: () => 0,
  End: (_here, last) => last,
};

/** From a row's first link or button the arrows, Home and End go to the same place in another row. */
function moveByRow(event: KeyboardEvent<HTMLTableElement>): void {
  const step = keyTargets[event.key];
  if (!step) return;
  const rows = [...event.currentTarget.querySelectorAll('tbody tr')];
  const places = rows.flatMap((row) => row.querySelector<HTMLElement>('a[href], button:not(:disabled)') ?? []);
  const here = places.findIndex((place) => place === event.target);
  if (here === -1) return;
  event.preventDefault();
  places[step(here, places.length - 1)]?.focus();
}

/** A table with open sides, a hairline under each row and a rule under the head. */
export function Table({ caption, rows = 'records', stacked, pictures, className, children, ...rest }: TableProps) {
  const classes = joinClasses(
    'table',
    rows !== 'records' && `is-${rows}`,
    stacked && 'is-stacked',
    pictures && 'has-pictures',
    className,
  );
  return (
    <div className="scroll-x">
      <table {...rest} className={classes} onKeyDown={moveByRow}>
        <caption className="sr-only">{caption}</caption>
        {children}
      </table>
    </div>
  );
}
