import { queryOptions, useQuery } from '@tanstack/react-query';
import type { Person } from '#shared/contracts/people.ts';
import { SessionView } from '#shared/contracts/people.ts';
import { keepRequestToken, read } from './api.ts';

/** Who is signed in here. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  staleTime: 60_000,
  queryFn: async ({ signal }) => {
    const session = await read('/session', SessionView, signal);
    keepRequestToken(session.requestToken);
    return session;
  },
});

/** The signed-in person. Pages that call it stand behind the sign-in, so there is one. */
export function usePerson(): Person {
  const { data } = useQuery(sessionQuery);
  if (!data?.person) throw new Error('a page behind the sign-in was drawn without a person');
  return data.person;
}
