import { z } from 'zod';
import { ChosenPassword } from '#shared/contracts/people.ts';
import { route } from '../../../http/route.ts';
import { beginSession } from '../../../http/session.ts';
import { acceptInvitation, findLinkFor } from '../service/accept-invitation.ts';
import { setPasswordByLink } from '../service/passwords.ts';
import { sessionView } from './session.ts';

const LinkPath = z.object({ token: z.string().max(128) });

/** What a one-time link opens: an invitation, or a new password. */
export const linkRoutes = [
  route({
    method: 'get',
    path: '/invitations/:token',
    rule: { who: 'anyone' },
    params: LinkPath,
    handle: ({ context, params }) => findLinkFor(context, { token: params.token, purpose: 'invitation' }),
  }),
  route({
    method: 'post',
    path: '/invitations/:token',
    rule: { who: 'anyone' },
    params: LinkPath,
    body: ChosenPassword,
    answers: 'made',
    handle: async ({ context, params, body, request }) => {
      const person = await acceptInvitation(context, params.token, body.password);
      await beginSession(request, person);
      return sessionView(context, request, person);
    },
  }),
  route({
    method: 'get',
    path: '/password-links/:token',
    rule: { who: 'anyone' },
    params: LinkPath,
    handle: ({ context, params }) => findLinkFor(context, { token: params.token, purpose: 'password' }),
  }),
  route({
    method: 'post',
    path: '/password-links/:token',
    rule: { who: 'anyone' },
    params: LinkPath,
    body: ChosenPassword,
    answers: 'nothing',
    handle: ({ context, params, body }) => setPasswordByLink(context, params.token, body.password),
  }),
];
