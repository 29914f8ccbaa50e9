import type { FractographView } from '#shared/contracts/fractographs.ts';
import { FigureCaption } from '#src/ui/figure-caption.tsx';
import { joinClasses } from '#src/ui/join-classes.ts';
import { ProgressLine } from '#src/ui/progress-line.tsx';
import { previewOf } from '../api.ts';

type FigureListProps = {
  number: string;
  figures: readonly FractographView[];
  chosenId: string | null;
  onChosen: (id: string) => void;
};

/** Every fractograph of the case, small, in the order of its figures. */
export function FigureList({ number, figures, chosenId, onChosen }: FigureListProps) {
  return (
    <ul className="grid grid-cols-3 gap-x-[14px] gap-y-5 narrow:grid-cols-2" aria-label="Figures of this case">
      {figures.map((figure) => (
        <li key={figure.id}>
          <button
            type="button"
            aria-pressed={figure.id === chosenId}
            onClick={() => onChosen(figure.id)}
            className={joinClasses(
              'block w-full border-t-3 pt-1 text-left',
              figure.id === chosenId ? 'border-ink' : 'border-transparent',
            )}
          >
            <SmallPicture number={number} figure={figure} />
            <FigureCaption number={`Fig. ${figure.figureNumber}`}>{shortWords(figure)}</FigureCaption>
          </button>
        </li>
      ))}
    </ul>
  );
}

function SmallPicture({ number, figure }: { number: string; figure: FractographView }) {
  if (figure.state === 'ready')
    return (
      <img
        src={previewOf(number, figure.id, 320)}
        alt=""
        loading="lazy"
        className="aspect-[4/3] w-full bg-well object-cover"
      />
    );
  return (
    <span className="flex aspect-[4/3] w-full flex-col justify-center bg-well px-3 text-s text-ink-2">
      {figure.state === 'refused' ? <b className="text-iron">refused</b> : <Settling figure={figure} />}
    </span>
  );
}

function Settling({ figure }: { figure: FractographView }) {
  const isCutting = figure.state === 'cutting tiles';
  return (
    <ProgressLine
      label={isCutting ? 'cutting tiles' : figure.state}
      share={figure.progress}
      amount={isCutting ? `${Math.floor(figure.progress * 100)} %` : null}
    />
  );
}

function shortWords(figure: FractographView): string {
  const what = figure.caption || figure.fileName;
  const scale = figure.state !== 'ready' || figure.scale ? '' : ', uncalibrated';
  return `${what}${figure.scale?.stale ? ', scale stale' : scale}`;
}
