import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import {
  HeldMailOpened,
  HeldMailPage,
  LaboratoryView,
  MailPage,
  TrailCheck,
  TrailPage,
} from '#shared/contracts/laboratory.ts';
import { read, send } from '#src/http/api.ts';

/** What the head of the place says. */
export const laboratoryQuery = queryOptions({
  queryKey: ['laboratory'],
  queryFn: ({ signal }) => read('/laboratory', LaboratoryView, signal),
});

const before = (id: string | null) => (id === null ? '' : `?before=${id}`);
const first: string | null = null;

/** The outbox, newest first, page after page. */
export const mailsQuery = infiniteQueryOptions({
  queryKey: ['laboratory', 'mail'],
  initialPageParam: first,
  queryFn: ({ signal, pageParam }) => read(`/mail${before(pageParam)}`, MailPage, signal),
  getNextPageParam: (page: MailPage) => page.older,
});

/** The box on this machine, newest first, page after page. */
export const heldMailsQuery = infiniteQueryOptions({
  queryKey: ['laboratory', 'held mail'],
  initialPageParam: first,
  queryFn: ({ signal, pageParam }) => read(`/held-mail${before(pageParam)}`, HeldMailPage, signal),
  getNextPageParam: (page: HeldMailPage) => page.older,
});

export type TrailFilter = { personId?: string; act?: string; from?: string };

/** The audit trail, newest first, page after page. */
export const trailQuery = (filter: TrailFilter) =>
  infiniteQueryOptions({
    queryKey: ['laboratory', 'trail', filter],
    initialPageParam: first,
    queryFn: ({ signal, pageParam }) => {
      const asked = new URLSearchParams(
        Object.entries({ ...filter, before: pageParam ?? undefined }).filter((pair): pair is [string, string] =>
          Boolean(pair[1]),
        ),
      );
      return read(`/trail?${asked.toString()}`, TrailPage, signal);
    },
    getNextPageParam: (page: TrailPage) => (page.older === null ? null : String(page.older)),
  });

export function useLaboratoryActs() {
  const client = useQueryClient();
  const again = () => client.invalidateQueries({ queryKey: ['laboratory'] });
  return {
    openHeld: useMutation({
      mutationFn: (id: string) => send('POST', `/held-mail/${id}/opening`, {}, HeldMailOpened),
    }),
    sendAgain: useMutation({
      mutationFn: (id: string) => send('POST', `/mail/${id}/again`, {}, z.null()),
      onSettled: again,
    }),
    checkTrail: useMutation({ mutationFn: () => read('/trail/check', TrailCheck) }),
  };
}
