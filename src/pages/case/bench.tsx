import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import { actsInCase } from '#src/features/cases/acts-in-case.ts';
import { caseOf } from '#src/features/cases/api.ts';
import { fractographsOf } from '#src/features/fractographs/api.ts';
import { marksOf } from '#src/features/marks/api.ts';
import { usePerson } from '#src/http/session.ts';
import { useBenchPlace } from '#src/theme/theme.ts';
import { Button } from '#src/ui/button.tsx';
import { ButtonLink } from '#src/ui/button-link.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { NothingHere } from '../nothing-here.tsx';
import { BenchTable } from './bench-table.tsx';

/** The bench: one fractograph, with its mating face beside it, examined and marked. */
export function Component() {
  const { number = '', fractographId = '' } = useParams();
  useBenchPlace();
  const person = usePerson();
  const navigate = useNavigate();
  const opened = useQuery(caseOf(number));
  const figures = useQuery(fractographsOf(number));
  const marks = useQuery(marksOf(number, fractographId));
  if (opened.isPending || figures.isPending || marks.isPending)
    return <Waiting words="Laying the image on the bench…" />;
  const failed = [opened, figures, marks].find(({ isError }) => isError);
  const current = figures.data?.find(({ id }) => id === fractographId);
  if (opened.data?.seenAs !== 'laboratory' || !figures.data || !marks.data || !current) {
    return failed && current ? (
      <Apart>
        <ErrorState
          what="The bench could not be opened."
          why={failed.error?.message}
          holds="Nothing was lost: marks kept stand as they were."
          acts={<Button onClick={() => void navigate(0)}>Open it again</Button>}
        />
      </Apart>
    ) : (
      <NothingHere />
    );
  }
  if (current.state !== 'ready') return <NotReady number={number} image={current} />;
  return (
    <BenchTable
      key={current.id}
      number={number}
      figures={figures.data}
      current={current}
      mate={figures.data.find(({ id, state }) => id === current.mateId && state === 'ready') ?? null}
      kept={marks.data}
      person={person}
      acts={actsInCase(person, opened.data)}
    />
  );
}

function Waiting({ words }: { words: string }) {
  return (
    <Apart>
      <LoadingState words={words} />
    </Apart>
  );
}

function Apart({ children }: { children: React.ReactNode }) {
  return (
    <main id="content" className="mx-auto mt-10 max-w-[640px] px-edge">
      {children}
    </main>
  );
}

function NotReady({ number, image }: { number: string; image: FractographView }) {
  const isRefused = image.state === 'refused';
  return (
    <Apart>
      <EmptyState
        title={`Fig. ${image.figureNumber} is not on the bench yet`}
        acts={<ButtonLink to={`/cases/${number}/fractographs`}>Go to the fractographs</ButtonLink>}
      >
        {isRefused
          ? `${image.fileName} was refused: ${image.refusedReason ?? 'it is no image that can be read'}.`
          : `${image.fileName} is being made ready, ${Math.round(image.progress * 100)} of 100. This page opens it when it is done.`}
      </EmptyState>
    </Apart>
  );
}
