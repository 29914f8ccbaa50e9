import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { TrailEntry } from '#shared/contracts/laboratory.ts';
import { formatInstant } from '#shared/wording/dates.ts';
import { Choice } from '#src/ui/choice.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { trailQuery, type TrailFilter } from '../api.ts';
import { ChangeWords } from './change-words.tsx';
import { OlderButton } from './older-button.tsx';

const all = 'all';
const spans = [
  { value: all, words: 'at any time', days: null },
  { value: '1', words: 'today', days: 0 },
  { value: '7', words: 'in the last 7 days', days: 7 },
  { value: '30', words: 'in the last 30 days', days: 30 },
] as const;

type Asked = { act: string; personId: string; span: string };

/** The trail with its filter sentence, page after page. */
export function AuditTrail({ people }: { people: readonly { id: string; name: string }[] }) {
  const [asked, setAsked] = useState<Asked>({ act: all, personId: all, span: all });
  const [now] = useState(() => new Date());
  const query = useInfiniteQuery(trailQuery(filterOf(asked, now)));
  const acts = query.data?.pages[0]?.acts ?? [];
  const choose = (change: Partial<Asked>) => setAsked((before) => ({ ...before, ...change }));
  return (
    <>
      <p className="filter-sentence my-3">
        Show{' '}
        <Choice
          label="Act"
          value={asked.act}
          options={[{ value: all, words: 'every act' }, ...acts.map(({ act, words }) => ({ value: act, words }))]}
          onChosen={(act) => choose({ act })}
        />{' '}
        by{' '}
        <Choice
          label="Person"
          value={asked.personId}
          options={[{ value: all, words: 'anyone' }, ...people.map(({ id, name }) => ({ value: id, words: name }))]}
          onChosen={(personId) => choose({ personId })}
        />{' '}
        <Choice label="When" value={asked.span} options={spans} onChosen={(span) => choose({ span })} />.
      </p>
      {query.isPending ? <LoadingState words="Reading the trail…" /> : null}
      {query.isError ? <ErrorState what="The trail could not be read." why={query.error.message} /> : null}
      {query.data ? <Entries entries={query.data.pages.flatMap((page) => page.entries)} /> : null}
      <OlderButton query={query} what="Older entries" />
    </>
  );
}

function filterOf({ act, personId, span }: Asked, now: Date): TrailFilter {
  const days = spans.find(({ value }) => value === span)?.days ?? null;
  const midnight = Date.UTC(now.getUTCFullYear(), now.getUTCMonth(), now.getUTCDate() - (days ?? 0));
  return {
    act: act === all ? undefined : act,
    personId: personId === all ? undefined : personId,
    from: days === null ? undefined : new Date(midnight).toISOString(),
  };
}

function Entries({ entries }: { entries: readonly TrailEntry[] }) {
  if (entries.length === 0)
    return <EmptyState>Nothing of the kind stands in the trail; widen the sentence above.</EmptyState>;
  return (
    <Table caption="Audit trail" stacked>
      <thead>
        <tr>
          <Th>When</Th>
          <Th>Who</Th>
          <Th>What</Th>
          <Th>Before and after</Th>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <tr key={entry.id}>
            <td className="is-wide whitespace-nowrap text-ink-2">{formatInstant(entry.at).replace(' UTC', '')}</td>
            <td className="whitespace-nowrap">{entry.personName}</td>
            <td className="is-wide">
              {entry.words}
              {entry.object && entry.object !== entry.personName ? (
                <span className="text-ink-2">: {entry.object}</span>
              ) : null}
              {entry.caseNumber ? <span className="mono ml-2 text-s text-ink-2">{entry.caseNumber}</span> : null}
            </td>
            <td className="is-wide py-1">
              <ChangeWords before={entry.before} after={entry.after} />
              {entry.reason ? <span className="block text-s text-ink-2">because {entry.reason}</span> : null}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
