import { useEffect, useRef, type ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

/** Chapters along a rule: real links as children, the current one brought into view when the row is too long. */
export function Chapters({ label, children }: { label: string; children: ReactNode }) {
  const row = useRef<HTMLElement>(null);
  useEffect(() => {
    const current = row.current?.querySelector<HTMLElement>('[aria-current="page"]');
    if (!row.current || !current) return;
    row.current.scrollLeft = current.offsetLeft - (row.current.clientWidth - current.offsetWidth) / 2;
  });
  return (
    <nav ref={row} className="chapters relative" aria-label={label}>
      {children}
    </nav>
  );
}

type ChapterWordsProps = { numeral: string; words: ReactNode; remark?: ReactNode; stale?: boolean };

/** What stands in a chapter's link: numeral, word, and a count or "1 stale". */
export function ChapterWords({ numeral, words, remark, stale }: ChapterWordsProps) {
  return (
    <>
      <i aria-hidden>{numeral}</i>
      {words}
      {remark ? <small className={joinClasses(stale && 'is-stale')}>{remark}</small> : null}
    </>
  );
}
