import { queryOptions, useQuery } from '@tanstack/react-query';
import type { Person, PersonSettings } from '#shared/contracts/people.ts';
import { SessionView } from '#shared/contracts/people.ts';
import { keepSession, read } from './api.ts';
import { queryClient } from './query-client.ts';
import { waitForSignIn } from './session-ended.ts';

const queryKey = ['session'];

/** Who is signed in here. While a person's page is open and their session has ended, it waits for them to come back. */
export const sessionQuery = queryOptions({
  queryKey,
  staleTime: 60_000,
  queryFn: async ({ signal }) => {
    const known = queryClient.getQueryData<SessionView>(queryKey)?.person;
    const session = await read('/session', SessionView, signal);
    const isGone = known && !session.person;
    if (isGone && (await waitForSignIn())) return keepSession(await read('/session', SessionView));
    return keepSession(session);
  },
});

/** Takes a session just begun as the one of this page. */
export function takeSession(session: SessionView): void {
  queryClient.setQueryData(queryKey, keepSession(session));
}

function useSignedIn() {
  const { data } = useQuery(sessionQuery);
  if (!data?.person || !data.settings) throw new Error('a page behind the sign-in was drawn without a person');
  return { person: data.person, settings: data.settings };
}

/** The signed-in person. Pages that call it stand behind the sign-in, so there is one. */
export function usePerson(): Person {
  return useSignedIn().person;
}

/** What the signed-in person has set for themselves. */
export function useSettings(): PersonSettings {
  return useSignedIn().settings;
}
