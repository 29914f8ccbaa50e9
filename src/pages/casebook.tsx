import { PlusIcon } from '@phosphor-icons/react/dist/csr/Plus';
import { useQuery } from '@tanstack/react-query';
import type { ComponentProps } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import type { CasebookCounts, CasebookPage, CasebookQuery } from '#shared/contracts/casebook.ts';
import type { Verdict } from '#shared/vocabulary/estimate-lines.ts';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { caseChoices, casebookCounts, casebookOf } from '#src/features/cases/api.ts';
import { readAddress, writeAddress } from '#src/features/cases/casebook-address.ts';
import { CasebookFoot } from '#src/features/cases/components/casebook-foot.tsx';
import { CasebookTable } from '#src/features/cases/components/casebook-table.tsx';
import { CasebookTabs } from '#src/features/cases/components/casebook-tabs.tsx';
import { FilterSentence } from '#src/features/cases/components/filter-sentence.tsx';
import { NumbersTable } from '#src/features/cases/components/numbers-table.tsx';
import { RequestsTable } from '#src/features/cases/components/requests-table.tsx';
import { WordsSearch } from '#src/features/cases/components/words-search.tsx';
import { verdictsOf } from '#src/features/estimates/api.ts';
import { VerdictWord } from '#src/features/estimates/components/verdict-word.tsx';
import { leadSentence, reviewSentence, staleSentence } from '#src/features/cases/lead-sentence.ts';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { ButtonLink } from '#src/ui/button-link.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';

/** The Casebook of the laboratory; outside it, one's own requests. */
export function Component() {
  const person = usePerson();
  const [search, setSearch] = useSearchParams();
  const query = readAddress(search);
  const page = useQuery(casebookOf(writeAddress(query)));
  const counts = useQuery(casebookCounts);
  const isStaff = mayInLaboratory(person, 'read people').allowed;
  const choices = useQuery({ ...caseChoices, enabled: isStaff });
  const change = (said: Record<string, string>) => {
    const next = readAddress(new URLSearchParams({ ...Object.fromEntries(search), page: '1', ...said }));
    setSearch(writeAddress(next), { replace: 'words' in said });
  };
  const isLaboratory = person.organisationKind === 'laboratory';
  const readsWork = isLaboratory && person.roles.some((role) => role !== 'administrator' && role !== 'requester');
  const thisYear = counts.data ? new Date(counts.data.asOf).getUTCFullYear() : null;
  return (
    <main id="content" className="px-edge pb-4">
      <div className="page-head">
        <div>
          <h1>{isLaboratory ? 'Casebook' : 'My requests'}</h1>
          {counts.data ? <Lead counts={counts.data} detailed={readsWork} /> : <p className="lead">&nbsp;</p>}
        </div>
        {mayInLaboratory(person, 'open a case').allowed ? (
          <ButtonLink kind="main" to="/cases/new" icon={<PlusIcon size={16} aria-hidden />}>
            Open a case
          </ButtonLink>
        ) : null}
      </div>
      {readsWork ? <CasebookTabs counts={counts.data} query={query} /> : null}
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-2 py-2">
        {readsWork ? <FilterSentence {...{ query, thisYear }} choices={choices.data} onChange={change} /> : null}
        <WordsSearch
          within={readsWork ? 'Number, part or what happened' : isLaboratory ? 'Number' : 'Number or what was sent'}
          words={query.words}
          focused={search.has('find')}
          onWords={(words) => change({ words })}
        />
      </div>
      {page.isPending ? <LoadingState words="Reading the cases…" /> : null}
      {page.isError ? (
        <ErrorState
          what="The cases could not be read."
          why={page.error.message}
          acts={<Button onClick={() => void page.refetch()}>Read them again</Button>}
        />
      ) : null}
      {page.data ? (
        <Cases page={page.data} query={query} personId={person.id} onChange={change} all={counts.data?.all} />
      ) : null}
      {page.data && page.data.rows.length > 0 ? (
        <CasebookFoot
          query={query}
          shown={page.data.rows.length}
          total={page.data.total}
          earlier={counts.data ? counts.data.all - counts.data.thisYear : 0}
        />
      ) : null}
    </main>
  );
}

function Lead({ counts, detailed }: { counts: CasebookCounts; detailed: boolean }) {
  if (!detailed) return <p className="lead">{leadSentence(counts)}</p>;
  return (
    <p className="lead">
      {leadSentence(counts)} {staleSentence(counts.stale)}
      {counts.stale > 0 ? <Link to="/?year=any&stale=1">a stale value</Link> : null}; {reviewSentence(counts.inReview)}
    </p>
  );
}

/** The laboratory's rows, with the verdicts over their lines of evidence as soon as these are read. */
function StaffCases(props: Omit<ComponentProps<typeof CasebookTable>, 'linesOf'>) {
  const { data } = useQuery(verdictsOf(props.rows.map((row) => row.number)));
  const verdicts = new Map<string, Verdict>(data?.map(({ number, verdict }) => [number, verdict]));
  return (
    <CasebookTable {...props} linesOf={(number) => (data ? <VerdictWord verdict={verdicts.get(number)} /> : null)} />
  );
}

type CasesProps = {
  page: CasebookPage;
  query: CasebookQuery;
  personId: string;
  all: number | undefined;
  onChange: (said: Record<string, string>) => void;
};

function Cases({ page, query, personId, all, onChange }: CasesProps) {
  const { rows, asOf } = page;
  if (rows.length === 0)
    return all === 0 ? (
      <EmptyState>No case has been opened yet. The first one gets the number 0001 of this year.</EmptyState>
    ) : (
      <EmptyState acts={<ButtonLink to="/?year=any">Show every case</ButtonLink>}>
        No case fits this. Take a word out, or widen the sentence above.
      </EmptyState>
    );
  const staff = rows.filter((row) => row.seenAs === 'laboratory');
  const followed = rows.filter((row) => row.seenAs === 'requester');
  const numbers = rows.filter((row) => row.seenAs === 'administrator');
  const onOrder = (order: CasebookQuery['order']) => {
    const turned = query.direction === 'descending' ? 'ascending' : 'descending';
    const first = order === 'number' || order === 'age' ? 'descending' : 'ascending';
    onChange({ order, direction: query.order === order ? turned : first });
  };
  if (staff.length > 0) return <StaffCases {...{ asOf, query, personId, onOrder }} rows={staff} />;
  return followed.length > 0 ? <RequestsTable rows={followed} /> : <NumbersTable rows={numbers} />;
}
