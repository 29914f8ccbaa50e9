import { useQuery } from '@tanstack/react-query';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import type { EstimatesView } from '#shared/contracts/estimates.ts';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { estimatesOf } from '#src/features/estimates/api.ts';
import { ReasonedPage } from '#src/features/estimates/components/reasoned-page.tsx';
import { fractographsOf } from '#src/features/fractographs/api.ts';
import { FigureStrip } from '#src/features/fractographs/components/figure-strip.tsx';
import { FigureWithMarks } from '#src/features/fractographs/components/figure-with-marks.tsx';
import { marksOf } from '#src/features/marks/api.ts';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { FigureCaption } from '#src/ui/figure-caption.tsx';
import { MatingFacesHint } from '#src/ui/glyphs/mating-faces-hint.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { ChapterNotRead } from './chapter-not-read.tsx';
import { useCase } from './case-context.ts';

const seenFolio = { chapter: 'iv', words: 'What was seen', side: 'left' } as const;
const reasonedFolio = { chapter: 'iv', words: 'What was reasoned', side: 'right' } as const;

/** Chapter iv: the stress at the origin by three lines of evidence, beside the figure they were read from. */
export function Component() {
  const { number = '' } = useParams();
  const { case: view, acts } = useCase();
  const estimates = useQuery(estimatesOf(number));
  if (estimates.isError)
    return (
      <ChapterNotRead
        chapter="Estimates"
        what="The estimates"
        error={estimates.error}
        onAgain={() => void estimates.refetch()}
      />
    );
  if (estimates.isPending) return <Reading />;
  return (
    <Spread>
      <Page label="What was seen" folio={seenFolio}>
        <div className="min-[1101px]:sticky min-[1101px]:top-4">
          <SeenFigure number={number} estimates={estimates.data} />
        </div>
      </Page>
      <Page label="What was reasoned" folio={reasonedFolio}>
        <ReasonedPage
          caseNumber={number}
          view={estimates.data}
          materialId={view.material?.id ?? null}
          mayEstimate={acts.estimate}
        />
      </Page>
    </Spread>
  );
}

/** The figure asked for in the address, else the one the image lines were read from, else the first. */
function SeenFigure({ number, estimates }: { number: string; estimates: EstimatesView }) {
  const [search] = useSearchParams();
  const { data: fractographs = [] } = useQuery(fractographsOf(number));
  const asked = fractographs.find((each) => String(each.figureNumber) === search.get('fig'));
  const shown = asked ?? readFrom(fractographs, estimates) ?? fractographs[0];
  const { data: marks = [] } = useQuery({ ...marksOf(number, shown?.id ?? ''), enabled: shown !== undefined });
  if (!shown) {
    return (
      <EmptyState hint={<MatingFacesHint />}>
        No fractograph yet. <Link to={`/cases/${number}/fractographs`}>Bring in the faces</Link> to read a mirror and a
        flaw.
      </EmptyState>
    );
  }
  return (
    <>
      <figure>
        <FigureWithMarks caseNumber={number} fractograph={shown} marks={marks.filter((mark) => !mark.removed)} />
        <FigureCaption number={`Fig. ${shown.figureNumber}`}>
          {captionOf(shown)}{' '}
          <Link className="screen-only whitespace-nowrap" to={`/cases/${number}/fractographs/${shown.id}`}>
            Open on the bench
          </Link>
        </FigureCaption>
      </figure>
      <FigureStrip
        caseNumber={number}
        fractographs={fractographs}
        shownId={shown.id}
        addressOf={(each) => `?fig=${each.figureNumber}`}
      />
    </>
  );
}

function readFrom(fractographs: readonly FractographView[], { estimates }: EstimatesView) {
  const read = estimates
    .filter((each) => each.isCompared)
    .flatMap((each) =>
      each.inputs.flatMap(({ source }) => (source.kind === 'measurement' ? source.fractographId : [])),
    );
  return fractographs.find((each) => read.includes(each.id));
}

function captionOf({ caption, scale }: FractographView): string {
  const seen = caption === '' || /[.!?]$/.test(caption) ? caption : `${caption}.`;
  if (!scale) return `${seen} Uncalibrated: no length is read from it.`.trim();
  const pixel = formatNumber(scale.pixelSizeXUm, { significantFigures: 4 });
  return `${seen} ${pixel} µm per pixel, from ${scale.code ?? scale.source}.`.trim();
}

function Reading() {
  return (
    <Spread>
      <Page label="What was seen" folio={seenFolio}>
        <LoadingState words="Reading the figure…" />
      </Page>
      <Page label="What was reasoned" folio={reasonedFolio}>
        <LoadingState words="Reading estimates…">
          <RuleHead aside="three lines of evidence">Stress at the origin</RuleHead>
        </LoadingState>
      </Page>
    </Spread>
  );
}
