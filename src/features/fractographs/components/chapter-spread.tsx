import { useQueryClient } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import type { Answer } from '#shared/rules/may.ts';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { MatingFacesHint } from '#src/ui/glyphs/mating-faces-hint.tsx';
import { Note } from '#src/ui/note.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { fractographsOf } from '../api.ts';
import { arrivalsOf, useArrivals } from '../arrivals.ts';
import { ChooseImages, DropPlace } from './drop-place.tsx';
import { FigureDetails } from './figure-details.tsx';
import { FigureList } from './figure-list.tsx';
import { ImagesComingIn } from './images-coming-in.tsx';

type ChapterSpreadProps = {
  number: string;
  figures: readonly FractographView[];
  mayBringIn: Answer;
  mayCalibrate: Answer;
};

/** The chapter as a spread: figures at the left, the chosen one and what is coming in at the right. */
export function ChapterSpread({ number, figures, mayBringIn, mayCalibrate }: ChapterSpreadProps) {
  const client = useQueryClient();
  const arrivals = useMemo(
    () => arrivalsOf(number, () => void client.invalidateQueries({ queryKey: fractographsOf(number).queryKey })),
    [number, client],
  );
  const list = useArrivals(arrivals);
  const [search, setSearch] = useSearchParams();
  const chosen = figures.find(({ figureNumber }) => String(figureNumber) === search.get('fig')) ?? figures[0];
  const choose = (id: string) => {
    const figure = figures.find((each) => each.id === id);
    if (figure) setSearch({ fig: String(figure.figureNumber) }, { replace: true, preventScrollReset: true });
  };
  const take = (files: readonly File[]) => arrivals.bringIn(files);
  const left = (
    <Page label="Fractographs" folio={{ chapter: 'iii', words: 'What was seen', side: 'left' }}>
      <RuleHead aside={asideOf(figures)}>Fractographs</RuleHead>
      {figures.length === 0 ? (
        <EmptyChapter onFiles={take} mayBringIn={mayBringIn} />
      ) : (
        <>
          <div className="mt-4">
            <FigureList number={number} figures={figures} chosenId={chosen?.id ?? null} onChosen={choose} />
          </div>
          <BringMore onFiles={take} mayBringIn={mayBringIn} />
        </>
      )}
    </Page>
  );
  const shape = chosen === undefined && list.length === 0 ? 'single' : undefined;
  const spread = (
    <Spread shape={shape}>
      {left}
      {shape === 'single' ? null : (
        <Page label="The chosen figure" folio={{ chapter: 'iii', words: 'What is known of it', side: 'right' }}>
          <ImagesComingIn list={list} arrivals={arrivals} />
          {chosen ? (
            <FigureDetails
              key={chosen.id}
              number={number}
              figure={chosen}
              mayDescribe={mayBringIn}
              mayCalibrate={mayCalibrate}
            />
          ) : null}
        </Page>
      )}
    </Spread>
  );
  return mayBringIn.allowed ? <DropPlace onFiles={take}>{spread}</DropPlace> : spread;
}

function asideOf(figures: readonly FractographView[]): string {
  if (figures.length === 0) return 'an empty chapter';
  const bare = figures.filter(({ state, scale }) => state === 'ready' && !scale).length;
  const words = figures.length === 1 ? 'one figure' : `${figures.length} figures`;
  return bare > 0 ? `${words}, ${bare} uncalibrated` : words;
}

type BringingProps = { onFiles: (files: readonly File[]) => void; mayBringIn: Answer };

function EmptyChapter({ onFiles, mayBringIn }: BringingProps) {
  return (
    <EmptyState
      hint={<MatingFacesHint />}
      acts={
        mayBringIn.allowed ? (
          <>
            <ChooseImages main onFiles={onFiles} />
            <span className="text-ink-2">or drop them on this page</span>
          </>
        ) : null
      }
      help={
        mayBringIn.allowed
          ? 'TIFF, PNG, JPEG or WebP. The scale is taken from the image where it holds one, once you have looked at it.'
          : mayBringIn.reason
      }
    >
      {mayBringIn.allowed
        ? 'Bring in the first image of the fracture surface, and it opens on the bench.'
        : 'No image of the fracture surface has been brought in yet.'}
    </EmptyState>
  );
}

function BringMore({ onFiles, mayBringIn }: BringingProps) {
  if (!mayBringIn.allowed)
    return (
      <Note className="mt-6" tone="cobalt">
        {mayBringIn.reason}
      </Note>
    );
  return (
    <div className="acts mt-6">
      <ChooseImages onFiles={onFiles} />
      <span className="text-ink-2">or drop them on this page</span>
    </div>
  );
}
