import { CaretDownIcon } from '@phosphor-icons/react/dist/csr/CaretDown';
import { CaretUpIcon } from '@phosphor-icons/react/dist/csr/CaretUp';
import type { ReactNode } from 'react';
import { VisuallyHidden } from './visually-hidden.tsx';

type Sorted = 'ascending' | 'descending' | 'none';

type ThProps = {
  children: ReactNode;
  /** The head of a column of numbers, set right. */
  numeric?: boolean;
  /** A head only for a screen reader: the margin column, the picture column. */
  hidden?: boolean;
  /** How the table stands sorted by this column; given with `onSort`, the head is a button. */
  sorted?: Sorted;
  onSort?: () => void;
  className?: string;
};

/** The head of a column. */
export function Th({ children, numeric, hidden, sorted, onSort, className }: ThProps) {
  const classes = [numeric ? 'num' : '', className ?? ''].join(' ').trim();
  return (
    <th scope="col" aria-sort={sorted} className={classes === '' ? undefined : classes}>
      {hidden ? <VisuallyHidden>{children}</VisuallyHidden> : null}
      {!hidden && onSort ? (
        <button type="button" onClick={onSort}>
          {children}
          <SortCaret sorted={sorted} />
        </button>
      ) : null}
      {!hidden && !onSort ? children : null}
    </th>
  );
}

function SortCaret({ sorted }: { sorted?: Sorted }) {
  if (sorted === 'descending') return <CaretDownIcon size={11} aria-hidden />;
  if (sorted === 'ascending') return <CaretUpIcon size={11} aria-hidden />;
  return null;
}
