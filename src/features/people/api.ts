import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import {
  LinkView,
  OwnView,
  PeopleView,
  PersonSettings,
  SessionView,
  type AccountChange,
  type Invitation,
  type OrganisationChange,
  type OrganisationEntry,
  type OwnName,
  type PasswordChange,
  type SettingsChange,
  type SignIn,
} from '#shared/contracts/people.ts';
import { keepSession, read, send, type Method } from '#src/http/api.ts';
import { sessionQuery, takeSession } from '#src/http/session.ts';

/** Signs in on this machine; a fresh token is fetched first, because an ended session took its token with it. */
export async function signIn(tried: SignIn): Promise<SessionView> {
  keepSession(await read('/session', SessionView));
  const session = await send('POST', '/session', tried, SessionView);
  return session ?? read('/session', SessionView);
}

export type LinkPurpose = 'invitations' | 'password-links';

/** Whom a one-time link is for. */
export const linkQuery = (purpose: LinkPurpose, token: string) =>
  queryOptions({
    queryKey: ['link', purpose, token],
    staleTime: Infinity,
    queryFn: async ({ signal }) => {
      keepSession(await read('/session', SessionView, signal));
      return read(`/${purpose}/${encodeURIComponent(token)}`, LinkView, signal);
    },
  });

export const acceptInvitation = (token: string, password: string) =>
  send('POST', `/invitations/${encodeURIComponent(token)}`, { password }, SessionView);

export const setPasswordByLink = (token: string, password: string) =>
  send('POST', `/password-links/${encodeURIComponent(token)}`, { password }, z.null());

export async function askForPassword(mail: string): Promise<void> {
  keepSession(await read('/session', SessionView));
  await send('POST', '/password-links', { mail }, z.null());
}

/** One's own account. */
export const ownQuery = queryOptions({
  queryKey: ['me'],
  queryFn: ({ signal }) => read('/me', OwnView, signal),
});

export function useOwnActs() {
  const client = useQueryClient();
  const again = () => Promise.all([client.invalidateQueries(ownQuery), client.invalidateQueries(sessionQuery)]);
  return {
    rename: useMutation({ mutationFn: (own: OwnName) => send('PATCH', '/me', own, OwnView), onSettled: again }),
    set: useMutation({
      mutationFn: (settings: SettingsChange) => send('PATCH', '/me/settings', settings, PersonSettings),
      onSuccess: (settings) => {
        const session = client.getQueryData(sessionQuery.queryKey);
        if (session && settings) takeSession({ ...session, settings });
        return client.invalidateQueries(ownQuery);
      },
    }),
    changePassword: useMutation({
      mutationFn: (change: PasswordChange) => send('PUT', '/me/password', change, z.null()),
    }),
    signOutEverywhere: useMutation({ mutationFn: () => send('DELETE', '/me/sessions', undefined, z.null()) }),
  };
}

/** Everyone with an account or an invitation, and every organisation. */
export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: ({ signal }) => read('/people', PeopleView, signal),
});

/** What an administrator does to accounts, invitations and organisations; the list is read again after each. */
export function usePeopleActs() {
  return {
    invite: usePeopleAct((entry: Invitation) => ['POST', '/people', entry]),
    inviteAgain: usePeopleAct((id: string) => ['POST', `/people/${id}/invitation`, {}]),
    takeBack: usePeopleAct((id: string) => ['DELETE', `/people/${id}/invitation`, undefined]),
    change: usePeopleAct(({ id, ...change }: AccountChange & { id: string }) => ['PATCH', `/people/${id}`, change]),
    close: usePeopleAct(({ id, version }: Seen) => ['POST', `/people/${id}/closing`, { version }]),
    openAgain: usePeopleAct(({ id, version }: Seen) => ['POST', `/people/${id}/opening`, { version }]),
    enterOrganisation: usePeopleAct((entry: OrganisationEntry) => ['POST', '/organisations', entry]),
    renameOrganisation: usePeopleAct(({ id, ...change }: OrganisationChange & { id: string }) => [
      'PATCH',
      `/organisations/${id}`,
      change,
    ]),
  };
}

type Seen = { id: string; version: number };

function usePeopleAct<Given>(request: (given: Given) => [Method, string, unknown]) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (given: Given) => {
      const [method, path, body] = request(given);
      return send(method, path, body, z.unknown());
    },
    onSettled: () =>
      Promise.all([client.invalidateQueries(peopleQuery), client.invalidateQueries({ queryKey: ['laboratory'] })]),
  });
}
