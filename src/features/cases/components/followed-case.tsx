import type { FollowedCase as Followed, PlainState } from '#shared/contracts/cases.ts';
import { formatDay } from '#shared/wording/dates.ts';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';

const path: readonly PlainState[] = ['received', 'looked at', 'written up', 'being checked', 'answered'];

/** A case as its requester sees it: the path in plain words, where it stands, and since which day. */
export function FollowedCase({ followed }: { followed: Followed }) {
  const here = path.indexOf(followed.plainState);
  return (
    <>
      <header className="case-head">
        <div>
          <span className="case-number">{followed.number}</span>
          <h1>{followed.title}</h1>
        </div>
      </header>
      <Spread shape="single">
        <Page label="How far it is">
          <RuleHead>How far it is</RuleHead>
          {here === -1 ? (
            <p className="prose-measure mt-2">
              Withdrawn on {formatDay(followed.stateSince)}. It ends without an answer.
            </p>
          ) : (
            <ol className="mt-3 flex flex-wrap gap-x-8 gap-y-2">
              {path.map((state, index) => (
                <li
                  key={state}
                  aria-current={index === here ? 'step' : undefined}
                  className={
                    index === here
                      ? 'border-b-[3px] border-ink pb-1 font-serif font-medium italic'
                      : `border-b-[3px] pb-1 ${index < here ? 'border-rule' : 'border-hairline text-ink-3'}`
                  }
                >
                  {state}
                  {index === 0 ? (
                    <small className="block text-s text-ink-2">{formatDay(followed.receivedAt)}</small>
                  ) : null}
                  {index === here && index > 0 ? (
                    <small className="block text-s text-ink-2">since {formatDay(followed.stateSince)}</small>
                  ) : null}
                </li>
              ))}
            </ol>
          )}
          <p className="prose-measure mt-5">
            {followed.plainState === 'answered'
              ? 'The findings are checked and signed. The laboratory hands them over; ask it where they have not come.'
              : 'What is found is told once it has been checked and signed.'}{' '}
            “We don’t know” is a good answer where a face cannot be read.
          </p>
        </Page>
      </Spread>
    </>
  );
}
