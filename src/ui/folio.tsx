export type FolioProps = { chapter: string; words?: string; side: 'left' | 'right' };

/** The line at the foot of a page: the chapter's number outside, its side inside. */
export function Folio({ chapter, words, side }: FolioProps) {
  const number = <span>{chapter}</span>;
  const inside = words ? <span>{words}</span> : null;
  return (
    <div className="folio" aria-hidden>
      {side === 'left' ? number : inside}
      {side === 'left' ? inside : number}
    </div>
  );
}
