import { useQuery } from '@tanstack/react-query';
import { useEffect, type ReactNode } from 'react';
import { NavLink, Outlet, useNavigate, useParams } from 'react-router-dom';
import type { CaseView } from '#shared/contracts/cases.ts';
import { actsInCase } from '#src/features/cases/acts-in-case.ts';
import { caseOf } from '#src/features/cases/api.ts';
import { ActsMenu } from '#src/features/cases/components/acts-menu.tsx';
import { CaseHead, CaseStandsStill } from '#src/features/cases/components/case-head.tsx';
import { FollowedCase } from '#src/features/cases/components/followed-case.tsx';
import { Refusal } from '#src/http/api.ts';
import { usePerson } from '#src/http/session.ts';
import { isTyping } from '#src/shell/keys.ts';
import { Button } from '#src/ui/button.tsx';
import { Chapters, ChapterWords } from '#src/ui/chapters.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { NothingHere } from '../nothing-here.tsx';
import type { CaseContext } from './case-context.ts';

type Chapter = { key: string; numeral: string; to: string; words: string };

// Keys and numerals are those of the seven chapters, so that they stay when the fifth comes.
const chapters: readonly Chapter[] = [
  { key: '1', numeral: 'i', to: 'intake', words: 'Intake' },
  { key: '2', numeral: 'ii', to: 'evidence', words: 'Evidence' },
  { key: '3', numeral: 'iii', to: 'fractographs', words: 'Fractographs' },
  { key: '4', numeral: 'iv', to: 'estimates', words: 'Estimates' },
  { key: '6', numeral: 'vi', to: 'findings', words: 'Findings' },
  { key: '7', numeral: 'vii', to: 'review', words: 'Review' },
];

/** A case: its head and chapters, with the open chapter under them. Who only follows it sees its state in plain words. */
export function Component() {
  const { number = '' } = useParams();
  const person = usePerson();
  const answer = useQuery(caseOf(number));
  useChapterKeys(number, answer.data?.seenAs === 'laboratory');
  if (answer.isPending) return <LoadingState words="Opening the case…" />;
  if (answer.isError) {
    if (answer.error instanceof Refusal && ['not-found', 'not-allowed'].includes(answer.error.body.code))
      return <NothingHere />;
    return (
      <main id="content" className="mx-auto mt-10 max-w-[640px]">
        <ErrorState
          what={`${number} could not be opened.`}
          why={answer.error.message}
          holds="Nothing was lost: what had been kept stands as it was."
          acts={<Button onClick={() => void answer.refetch()}>Open it again</Button>}
        />
      </main>
    );
  }
  if (answer.data.seenAs === 'requester')
    return (
      <main id="content">
        <FollowedCase followed={answer.data} />
      </main>
    );
  const view = answer.data;
  const acts = actsInCase(person, view);
  const context: CaseContext = { case: view, acts };
  return (
    <>
      <CaseHead view={view} acts={<ActsMenu view={view} acts={acts} />} />
      <CaseStandsStill view={view} />
      <Chapters label={`Chapters of ${view.number}`}>
        {chapters.map(({ numeral, to, words }) => (
          <NavLink key={to} to={to}>
            <ChapterWords
              numeral={numeral}
              words={words}
              remark={remarkOf(to, view)}
              stale={to === 'intake' || staleIn(to, view) > 0}
            />
          </NavLink>
        ))}
      </Chapters>
      <main id="content">
        <Outlet context={context} />
      </main>
    </>
  );
}

function remarkOf(chapter: string, { urgency, counts }: CaseView): ReactNode {
  if (chapter === 'intake' && urgency === 'exposed now') return 'exposed now';
  if (chapter === 'fractographs') return counts.fractographs || null;
  const stale = staleIn(chapter, { counts });
  if (stale > 0) return `${stale} stale`;
  return chapter === 'estimates' ? counts.estimates || null : null;
}

function staleIn(chapter: string, { counts }: Pick<CaseView, 'counts'>): number {
  if (chapter === 'estimates') return counts.stale;
  return chapter === 'findings' ? counts.staleInText : 0;
}

/** 1 to 7 go to the chapters; off while typing and on the bench. */
function useChapterKeys(number: string, on: boolean): void {
  const navigate = useNavigate();
  useEffect(() => {
    if (!on) return;
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      const chapter = chapters.find(({ key }) => key === event.key);
      if (chapter) void navigate(`/cases/${number}/${chapter.to}`);
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [navigate, number, on]);
}
