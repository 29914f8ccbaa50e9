import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { QuestionsView } from '#shared/contracts/cases.ts';
import type { Answer } from '#shared/rules/may.ts';
import { formatDay, formatShortDay } from '#shared/wording/dates.ts';
import { Button } from '#src/ui/button.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { questionsOf } from '../api.ts';
import { questionsShown, questionsTakenOut, type QuestionShown } from '../question-history.ts';
import { AskedForm } from './asked-form.tsx';

/** What was asked, as agreed now: old wording struck beside the new, and what lies beside the scope. */
export function Asked({ number, mayEdit }: { number: string; mayEdit: Answer }) {
  const { data: versions, isPending } = useQuery(questionsOf(number));
  const [writing, setWriting] = useState(false);
  if (isPending || !versions) return <LoadingState words="Reading what was asked…" />;
  const newest: QuestionsView | undefined = versions[0];
  return (
    <section>
      <RuleHead aside={newest ? `version ${newest.version}, agreed ${formatDay(newest.madeAt)}` : 'nothing agreed yet'}>
        What was asked
      </RuleHead>
      {writing ? (
        <AskedForm number={number} newest={newest ?? null} onLeave={() => setWriting(false)} />
      ) : (
        <>
          <ol>
            {questionsShown(versions).map((question, index) => (
              <QuestionLine key={question.key} question={question} place={index + 1} />
            ))}
            {questionsTakenOut(versions).map((question) => (
              <li key={question.key} className="border-b border-hairline py-[6px] pl-7 text-ink-3">
                <s className="font-serif decoration-iron">{question.text}</s>{' '}
                <span className="text-s">taken out in version {newest?.version}</span>
              </li>
            ))}
          </ol>
          {newest && newest.besideScope !== '' ? (
            <p className="mt-[7px] text-[14px] text-ink-2">
              <i className="font-serif">Beside the scope:</i> {newest.besideScope}
            </p>
          ) : null}
          <div className="acts mt-2">
            <Button small closedBecause={mayEdit.allowed ? null : mayEdit.reason} onClick={() => setWriting(true)}>
              {newest ? 'Change what was agreed' : 'Agree the questions'}
            </Button>
          </div>
          <EarlierVersions versions={versions.slice(1)} />
        </>
      )}
    </section>
  );
}

function QuestionLine({ question, place }: { question: QuestionShown; place: number }) {
  const { changedIn, before } = question;
  return (
    <li className="grid grid-cols-[20px_1fr_156px] gap-x-2 border-b border-hairline py-[6px] narrow:grid-cols-[20px_1fr]">
      <span className="font-serif text-base text-ink-3 italic">{place}</span>
      <p className="font-serif text-base/[1.4]">
        {question.text} {before ? <s className="text-ink-3 decoration-iron">{before}</s> : null}
      </p>
      <span className="border-l border-rule pl-[10px] text-s/[1.35] text-ink-2 narrow:col-start-2 narrow:mt-1">
        {changedIn ? (
          <>
            <b className="text-ink">changed in {changedIn.version}</b>, by {changedIn.madeBy.name}: {changedIn.reason}
          </>
        ) : (
          `since version ${question.since}`
        )}
      </span>
    </li>
  );
}

function EarlierVersions({ versions }: { versions: readonly QuestionsView[] }) {
  if (versions.length === 0) return null;
  return (
    <details className="mt-2 text-s text-ink-2">
      <summary className="text-cobalt underline underline-offset-[3px]">
        {versions.length === 1 ? 'The version before' : `The ${versions.length} versions before`}
      </summary>
      {versions.map(({ version, madeAt, madeBy, questions }) => (
        <div key={version} className="mt-2">
          <b className="text-ink">Version {version}</b>, {formatShortDay(madeAt)}, {madeBy.name}
          <ol className="list-decimal pl-5">
            {questions.map(({ key, text }) => (
              <li key={key}>{text}</li>
            ))}
          </ol>
        </div>
      ))}
    </details>
  );
}
