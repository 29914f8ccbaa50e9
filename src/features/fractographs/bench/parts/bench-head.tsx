import { CaretLeftIcon } from '@phosphor-icons/react/dist/csr/CaretLeft';
import { CaretRightIcon } from '@phosphor-icons/react/dist/csr/CaretRight';
import { MoonIcon } from '@phosphor-icons/react/dist/csr/Moon';
import { SunIcon } from '@phosphor-icons/react/dist/csr/Sun';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import type { PersonHere } from '#shared/contracts/live.ts';
import { useTheme } from '../../../../theme/theme.ts';
import { Button } from '../../../../ui/button.tsx';
import { Kbd } from '../../../../ui/kbd.tsx';
import { ProductMark } from '../../../../ui/glyphs/product-mark.tsx';

type BenchHeadProps = {
  number: string;
  figures: readonly FractographView[];
  current: FractographView;
  /** Others who have the case open. */
  others: readonly PersonHere[];
  personName: string;
  /** "Kept 14:07", with Undo beside it while it can be undone. */
  kept: ReactNode;
};

/** The bench's own head: case and figure, the way to the next, who else is here, what is kept. */
export function BenchHead({ number, figures, current, others, personName, kept }: BenchHeadProps) {
  const chapter = `/cases/${number}/fractographs`;
  const index = figures.findIndex(({ id }) => id === current.id);
  return (
    <header className="bench-head">
      <Link to="/" className="flex items-center text-ink" aria-label="Hacklebook">
        <ProductMark size={22} />
      </Link>
      <Link className="back" to={chapter}>
        <span className="mono">{number}</span> <span className="chapter">Fractographs</span>
      </Link>
      <h1 title={current.caption}>
        <i>Fig.&nbsp;{current.figureNumber}</i> {figureWords(current)}
      </h1>
      <span className="turn">
        <Turn to={figures[index - 1]} chapter={chapter} words="Figure before">
          <CaretLeftIcon size={15} aria-hidden />
          <Kbd>K</Kbd>
        </Turn>
        <span>
          {index + 1} of {figures.length}
        </span>
        <Turn to={figures[index + 1]} chapter={chapter} words="Figure after">
          <Kbd>J</Kbd>
          <CaretRightIcon size={15} aria-hidden />
        </Turn>
      </span>
      <span className="ml-auto" />
      <OthersHere others={others} />
      <span className="kept-line">{kept}</span>
      <ThemeButton />
      <Link to="/me" className="who text-ink no-underline">
        {personName}
      </Link>
    </header>
  );
}

/** What is seen, in words; its file's name while nobody has said. */
export function figureWords({ caption, fragment, face, fileName }: FractographView): string {
  if (caption) return caption;
  if (fragment) return `Fragment ${fragment.code}${face ? `, face ${face}` : ''}`;
  return fileName;
}

type TurnProps = { to: FractographView | undefined; chapter: string; words: string; children: ReactNode };

function Turn({ to, chapter, words, children }: TurnProps) {
  if (!to) return <span className="flex items-center gap-1 text-ink-3">{children}</span>;
  return (
    <Link to={`${chapter}/${to.id}`} aria-label={words} title={words}>
      {children}
    </Link>
  );
}

const bars = ['bg-o-pore', 'bg-o-agg', 'bg-o-inc', 'bg-o-mach'] as const;

/** Who else has the case open, each with a bar of a colour of their own. */
function OthersHere({ others }: { others: readonly PersonHere[] }) {
  if (others.length === 0) return null;
  return (
    <span className="people flex gap-3 text-s text-ink-2" role="status" aria-label="Also here">
      {others.map(({ id, name }, index) => (
        <span key={id} className="flex items-center gap-[6px]">
          <span className={`h-4 w-[3px] ${bars[index % bars.length]}`} aria-hidden />
          {name}
        </span>
      ))}
    </span>
  );
}

function ThemeButton() {
  const { theme, setTheme } = useTheme();
  const isDark = theme === 'bench light';
  return (
    <Button
      small
      className="theme"
      icon={isDark ? <SunIcon size={15} aria-hidden /> : <MoonIcon size={15} aria-hidden />}
      onClick={() => setTheme(isDark ? 'paper' : 'bench light')}
    >
      {isDark ? 'Daylight' : 'Bench light'}
    </Button>
  );
}
