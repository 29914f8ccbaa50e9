import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { dayOf } from '#shared/wording/dates.ts';
import { caseOf } from '#src/features/cases/api.ts';
import { evidenceOf, facesTakenOf, materialsOffered } from '#src/features/evidence/api.ts';
import type { FacePicture } from '#src/features/evidence/components/face-pictures.ts';
import { PiecesPage } from '#src/features/evidence/components/pieces-page.tsx';
import { SeenPage } from '#src/features/evidence/components/seen-page.tsx';
import { usePerson } from '#src/http/session.ts';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { ChapterNotRead } from './chapter-not-read.tsx';

/** Chapter ii: what broke, its pieces, what is not there, and which faces belong together. */
export function Component() {
  const { number = '' } = useParams();
  const person = usePerson();
  const evidence = useQuery(evidenceOf(number));
  const { data: caseSeen } = useQuery(caseOf(number));
  const fractographs = useQuery(facesTakenOf(number));
  const materials = useQuery({ ...materialsOffered, enabled: mayInLaboratory(person, 'read materials').allowed });
  if (evidence.isPending) return <Reading />;
  if (evidence.isError)
    return (
      <ChapterNotRead
        chapter="Evidence"
        what="The pieces"
        error={evidence.error}
        onAgain={() => void evidence.refetch()}
      />
    );
  const offered = materials.data ?? [];
  const pictures = facePicturesFrom(number, fractographs.data ?? []);
  return (
    <Spread>
      <Page label="What broke" folio={{ chapter: 'ii', words: 'The pieces, seen', side: 'left' }}>
        <SeenPage
          number={number}
          evidence={evidence.data}
          materials={offered}
          pictures={pictures}
          caseSeen={caseSeen}
        />
      </Page>
      <Page label="Pieces" folio={{ chapter: 'ii', words: 'The pieces, held', side: 'right' }}>
        <PiecesPage
          number={number}
          evidence={evidence.data}
          materials={offered}
          holder={person.name}
          today={dayOf(new Date())}
        />
      </Page>
    </Spread>
  );
}

function facePicturesFrom(number: string, fractographs: readonly FractographView[]): FacePicture[] {
  return fractographs.flatMap(({ id, state, fragment, face, view, figureNumber, caption }) => {
    if (state !== 'ready' || !fragment || !face) return [];
    const src = `/api/cases/${number}/fractographs/${id}/preview?width=400`;
    return [{ fragmentId: fragment.id, face, view, figureNumber, caption, src }];
  });
}

function Reading() {
  return (
    <Spread>
      <Page label="What broke">
        <LoadingState words="Reading what broke…">
          <RuleHead>What broke</RuleHead>
        </LoadingState>
      </Page>
      <Page label="Pieces">
        <LoadingState words="Reading pieces…">
          <RuleHead>Pieces</RuleHead>
        </LoadingState>
      </Page>
    </Spread>
  );
}
