import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { ClosureCheckView, ReviewView, type NoteAccepted, type SignatureGiven } from '#shared/contracts/closure.ts';
import { read, send } from '#src/http/api.ts';

/** All of the chapter: readiness, rounds, signatures, what is sealed, and what this person may do. */
export const reviewOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'review'],
    queryFn: ({ signal }) => read(`/cases/${number}/review`, ReviewView, signal),
  });

const tenMinutesMs = 600_000;

/** The closure looked over again. Every file is read for it, so that it isn't asked for at each visit. */
export const checkOf = (number: string) =>
  queryOptions({
    queryKey: ['closure check', number],
    staleTime: tenMinutesMs,
    queryFn: ({ signal }) => read(`/cases/${number}/review/check`, ClosureCheckView, signal),
  });

export function useReviewActs(number: string) {
  const client = useQueryClient();
  const onSettled = async () => {
    await client.invalidateQueries({ queryKey: ['case', number] });
    await client.invalidateQueries({ queryKey: ['casebook'] });
  };
  const act = (path: string, body: unknown) => send('POST', `/cases/${number}${path}`, body, z.unknown());
  return {
    sendToReview: useMutation({ mutationFn: () => act('/review/send', {}), onSettled }),
    sendBack: useMutation({ mutationFn: (reasons: string) => act('/review/send-back', { reasons }), onSettled }),
    acceptNote: useMutation({ mutationFn: (note: NoteAccepted) => act('/review/notes/accept', note), onSettled }),
    sign: useMutation({ mutationFn: (given: SignatureGiven) => act('/signatures', given), onSettled }),
  };
}

export type ReviewActs = ReturnType<typeof useReviewActs>;
