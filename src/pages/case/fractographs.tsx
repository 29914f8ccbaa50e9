import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import type { Answer } from '#shared/rules/may.ts';
import { actsInCase } from '#src/features/cases/acts-in-case.ts';
import { caseOf } from '#src/features/cases/api.ts';
import { fractographsOf } from '#src/features/fractographs/api.ts';
import { ChapterSpread } from '#src/features/fractographs/components/chapter-spread.tsx';
import { Refusal } from '#src/http/api.ts';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';

const notYet: Answer = { allowed: false, reason: 'The case is still being read.' };

/** Chapter iii: the images of the fracture surfaces as they came in, and their scales. */
export function Component() {
  const { number = '' } = useParams();
  const person = usePerson();
  const figures = useQuery(fractographsOf(number));
  const { data: view } = useQuery(caseOf(number));
  if (figures.isPending) return <Reading />;
  if (figures.isError) return <NotRead error={figures.error} onAgain={() => void figures.refetch()} />;
  const acts = view?.seenAs === 'laboratory' ? actsInCase(person, view) : null;
  return (
    <ChapterSpread
      number={number}
      figures={figures.data}
      mayBringIn={acts?.['bring in fractographs'] ?? notYet}
      mayCalibrate={acts?.calibrate ?? notYet}
    />
  );
}

function Reading() {
  return (
    <Spread>
      <Page label="Fractographs">
        <LoadingState words="Reading fractographs…">
          <RuleHead>Fractographs</RuleHead>
        </LoadingState>
      </Page>
      <Page label="The chosen figure">{null}</Page>
    </Spread>
  );
}

function NotRead({ error, onAgain }: { error: Error; onAgain: () => void }) {
  const refusal = error instanceof Refusal ? error.body : null;
  const isRight = refusal?.code === 'not-allowed' || refusal?.code === 'not-found';
  return (
    <Spread shape="single">
      <Page label="Fractographs">
        <ErrorState
          what={isRight ? 'The fractographs of this case are not open to you.' : 'The fractographs could not be read.'}
          why={error.message}
          holds={isRight ? 'Ask the laboratory who has this case.' : 'Nothing was lost: what had been kept stands.'}
          reference={refusal?.reference}
          acts={isRight ? null : <Button onClick={onAgain}>Read them again</Button>}
        />
      </Page>
    </Spread>
  );
}
