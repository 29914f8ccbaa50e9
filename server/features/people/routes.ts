import { SignIn } from '#shared/contracts/people.ts';
import { route } from '../../http/route.ts';
import { requestToken } from '../../http/session.ts';
import { findSettings } from './service/find-settings.ts';
import { signIn } from './service/sign-in.ts';

export const peopleRoutes = [
  route({
    method: 'get',
    path: '/session',
    rule: { who: 'anyone' },
    handle: async ({ context, request }) => ({
      person: context.person,
      settings: context.person ? await findSettings(context, context.person.id) : null,
      requestToken: requestToken(request),
    }),
  }),
  route({
    method: 'post',
    path: '/session',
    rule: { who: 'anyone' },
    body: SignIn,
    answers: 'made',
    handle: async ({ context, body, request }) => {
      const person = await signIn(context, body);
      await new Promise<void>((done, fail) => request.login(person, (error) => (error ? fail(error) : done())));
      return { person, settings: await findSettings(context, person.id), requestToken: requestToken(request) };
    },
  }),
  route({
    method: 'delete',
    path: '/session',
    rule: { who: 'anyone' },
    answers: 'nothing',
    handle: async ({ request }) => {
      await new Promise<void>((done, fail) => request.logout((error) => (error ? fail(error) : done())));
    },
  }),
];
