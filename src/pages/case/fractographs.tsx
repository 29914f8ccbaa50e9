import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import type { Answer } from '#shared/rules/may.ts';
import { actsInCase } from '#src/features/cases/acts-in-case.ts';
import { caseOf } from '#src/features/cases/api.ts';
import { fractographsOf } from '#src/features/fractographs/api.ts';
import { ChapterSpread } from '#src/features/fractographs/components/chapter-spread.tsx';
import { usePerson } from '#src/http/session.ts';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { ChapterNotRead } from './chapter-not-read.tsx';

const notYet: Answer = { allowed: false, reason: 'The case is still being read.' };

/** Chapter iii: the images of the fracture surfaces as they came in, and their scales. */
export function Component() {
  const { number = '' } = useParams();
  const person = usePerson();
  const figures = useQuery(fractographsOf(number));
  const { data: view } = useQuery(caseOf(number));
  if (figures.isPending) return <Reading />;
  if (figures.isError)
    return (
      <ChapterNotRead
        chapter="Fractographs"
        what="The fractographs"
        error={figures.error}
        onAgain={() => void figures.refetch()}
      />
    );
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
