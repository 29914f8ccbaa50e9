import { PasswordAsk, SignIn, type SessionView } from '#shared/contracts/people.ts';
import type { Request } from 'express';
import type { VisitorContext } from '../../../http/context.ts';
import { machineOf } from '../../../http/limit-tries.ts';
import { route } from '../../../http/route.ts';
import { endSession, requestToken, signInLocally } from '../../../http/session.ts';
import { findSettings } from '../service/find-settings.ts';
import { noteSignOut, signOutEverywhere } from '../service/own-account.ts';
import { askForPassword } from '../service/passwords.ts';
import { signIn } from '../service/sign-in.ts';

/** Who is here, with the token that the page's requests carry. */
export async function sessionView(
  context: Pick<VisitorContext, 'reader'>,
  request: Request,
  person: VisitorContext['person'],
): Promise<SessionView> {
  const settings = person ? await findSettings(context, person.id) : null;
  return { person, settings, requestToken: requestToken(request) };
}

/** Coming in and going out. */
export const sessionRoutes = [
  route({
    method: 'get',
    path: '/session',
    rule: { who: 'anyone' },
    handle: ({ context, request }) => sessionView(context, request, context.person),
  }),
  route({
    method: 'post',
    path: '/session',
    rule: { who: 'anyone' },
    body: SignIn,
    answers: 'made',
    handle: async ({ context, request, response }) => {
      const person = await signInLocally(request, response, (tried) => signIn(context, tried, machineOf(request)));
      return sessionView(context, request, person);
    },
  }),
  route({
    method: 'delete',
    path: '/session',
    rule: { who: 'anyone' },
    answers: 'nothing',
    handle: async ({ context, request }) => {
      const { person } = context;
      await endSession(request);
      if (person) await noteSignOut(context, person);
    },
  }),
  route({
    method: 'delete',
    path: '/me/sessions',
    rule: { who: 'signed in' },
    answers: 'nothing',
    handle: async ({ context, request }) => {
      await endSession(request);
      await signOutEverywhere(context);
    },
  }),
  route({
    method: 'post',
    path: '/password-links',
    rule: { who: 'anyone' },
    body: PasswordAsk,
    answers: 'nothing',
    handle: ({ context, body }) => askForPassword(context, body.mail),
  }),
];
