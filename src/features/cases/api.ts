import {
  infiniteQueryOptions,
  keepPreviousData,
  queryOptions,
  useMutation,
  useQueryClient,
} from '@tanstack/react-query';
import { z } from 'zod';
import { CasebookCounts, CasebookPage } from '#shared/contracts/casebook.ts';
import {
  BackgroundList,
  CaseAnswer,
  CaseChoices,
  HistoryPage,
  QuestionsHistory,
  type CaseOpened,
} from '#shared/contracts/cases.ts';
import { CaseNumber } from '#shared/contracts/ids.ts';
import { read, send, type Method } from '#src/http/api.ts';

/** A page of the Casebook, by the query as it stands in the address. The page before stays until it is there. */
export const casebookOf = (search: string) =>
  queryOptions({
    queryKey: ['casebook', search],
    placeholderData: keepPreviousData,
    queryFn: ({ signal }) => read(`/cases${search === '' ? '' : `?${search}`}`, CasebookPage, signal),
  });

export const casebookCounts = queryOptions({
  queryKey: ['casebook', 'counts'],
  queryFn: ({ signal }) => read('/casebook/counts', CasebookCounts, signal),
});

/** Analysts, staff, organisations and materials that the forms of a case offer; for the laboratory alone. */
export const caseChoices = queryOptions({
  queryKey: ['casebook', 'choices'],
  staleTime: 60_000,
  queryFn: ({ signal }) => read('/casebook/choices', CaseChoices, signal),
});

export const caseOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'view'],
    queryFn: ({ signal }) => read(`/cases/${number}`, CaseAnswer, signal),
  });

export const questionsOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'questions'],
    queryFn: ({ signal }) => read(`/cases/${number}/questions`, QuestionsHistory, signal),
  });

export const backgroundOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'background'],
    queryFn: ({ signal }) => read(`/cases/${number}/background`, BackgroundList, signal),
  });

export const historyOf = (number: string) =>
  infiniteQueryOptions({
    queryKey: ['case', number, 'history'],
    initialPageParam: 0,
    queryFn: ({ pageParam, signal }) =>
      read(`/cases/${number}/history${pageParam === 0 ? '' : `?before=${pageParam}`}`, HistoryPage, signal),
    getNextPageParam: (last) => (last.hasEarlier ? last.entries.at(-1)?.id : undefined),
  });

const Opened = z.object({ number: CaseNumber });

export function useOpenCase() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (opened: CaseOpened) => send('POST', '/cases', opened, Opened),
    onSettled: () => client.invalidateQueries({ queryKey: ['casebook'] }),
  });
}

export type CaseActSent = {
  readonly method: Method;
  /** Below the case: "/hold"; empty for the case itself. */
  readonly path: string;
  readonly body: unknown;
};

/** Sends one act in a case; whether done or refused, the case is read again. */
export function useCaseAct(number: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ method, path, body }: CaseActSent) => send(method, `/cases/${number}${path}`, body, z.unknown()),
    onSettled: async () => {
      await client.invalidateQueries({ queryKey: ['case', number] });
      await client.invalidateQueries({ queryKey: ['casebook'] });
    },
  });
}
