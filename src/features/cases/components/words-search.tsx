import { useEffect, useRef, useState } from 'react';
import { SearchLine } from '#src/ui/search-line.tsx';

type WordsSearchProps = {
  words: string;
  /** What the words are looked for in. */
  within: string;
  /** True where the page was opened to find something. */
  focused: boolean;
  onWords: (words: string) => void;
};

const restMs = 250;

/** The search line: it asks once the typing rests. */
export function WordsSearch({ words, within, focused, onWords }: WordsSearchProps) {
  const [typed, setTyped] = useState(words);
  const [asked, setAsked] = useState(words);
  // The address was changed from elsewhere, by a tab or the way back: the line follows it.
  if (words !== asked) {
    setAsked(words);
    setTyped(words);
  }
  const line = useRef<HTMLDivElement>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => {
    if (focused) line.current?.querySelector('input')?.focus();
  }, [focused]);
  useEffect(() => () => clearTimeout(timer.current), []);
  const type = (next: string) => {
    setTyped(next);
    clearTimeout(timer.current);
    timer.current = setTimeout(() => {
      setAsked(next.trim());
      onWords(next.trim());
    }, restMs);
  };
  return (
    <div ref={line} className="ml-auto w-[290px] fold:ml-0 fold:w-full">
      <SearchLine
        label="Search these cases"
        placeholder={within}
        value={typed}
        onChange={(event) => type(event.target.value)}
      />
    </div>
  );
}
