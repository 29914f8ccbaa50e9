import type { ReactNode } from 'react';
import { Folio, type FolioProps } from './folio.tsx';

type PageProps = { label: string; children: ReactNode; folio?: FolioProps; className?: string };

/** One page of a spread, a named region that ends in its folio. */
export function Page({ label, children, folio, className }: PageProps) {
  return (
    <section className={`spread-page ${className ?? ''}`} aria-label={label}>
      {children}
      {folio ? <Folio {...folio} /> : null}
    </section>
  );
}
