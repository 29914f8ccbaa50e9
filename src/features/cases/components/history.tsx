import { useInfiniteQuery } from '@tanstack/react-query';
import { formatInstant } from '#shared/wording/dates.ts';
import { Button } from '#src/ui/button.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { historyOf } from '../api.ts';

/** Who did what in the case, newest first; nothing in it is ever changed. */
export function History({ number }: { number: string }) {
  const { data, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(historyOf(number));
  if (isPending || !data) return <LoadingState words="Reading the history…" />;
  return (
    <section>
      <RuleHead aside="newest first">History</RuleHead>
      <ol>
        {data.pages
          .flatMap(({ entries }) => entries)
          .map((entry) => (
            <li
              key={entry.id}
              className="grid grid-cols-[1fr_auto] gap-x-3 border-b border-hairline py-[5px] narrow:grid-cols-1"
            >
              <span>
                <b>{entry.personName}</b> {entry.words}
                {entry.reason ? <span className="text-ink-2">: {entry.reason}</span> : null}
              </span>
              <span className="text-s whitespace-nowrap text-ink-2">{formatInstant(entry.at)}</span>
            </li>
          ))}
      </ol>
      {hasNextPage ? (
        <div className="acts mt-2">
          <Button small disabled={isFetchingNextPage} onClick={() => void fetchNextPage()}>
            Show earlier acts
          </Button>
        </div>
      ) : null}
    </section>
  );
}
