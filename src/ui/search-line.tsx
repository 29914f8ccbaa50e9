import { MagnifyingGlassIcon } from '@phosphor-icons/react/dist/csr/MagnifyingGlass';
import type { ComponentProps } from 'react';

type SearchLineProps = Omit<ComponentProps<'input'>, 'className'> & { label: string; className?: string };

/** A field that searches: a single underline. */
export function SearchLine({ label, className, ...input }: SearchLineProps) {
  return (
    <label className={`search-line ${className ?? ''}`}>
      <MagnifyingGlassIcon size={15} aria-hidden />
      <input type="search" {...input} aria-label={label} />
    </label>
  );
}
