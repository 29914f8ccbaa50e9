import { OwnName, PasswordChange, SettingsChange } from '#shared/contracts/people.ts';
import { machineOf } from '../../../http/limit-tries.ts';
import { route } from '../../../http/route.ts';
import { changeOwnName, changeSettings, loadOwn } from '../service/own-account.ts';
import { changePassword } from '../service/passwords.ts';

/** One's own account. */
export const ownRoutes = [
  route({
    method: 'get',
    path: '/me',
    rule: { who: 'signed in' },
    handle: ({ context }) => loadOwn(context),
  }),
  route({
    method: 'patch',
    path: '/me',
    rule: { who: 'signed in' },
    body: OwnName,
    handle: ({ context, body }) => changeOwnName(context, body),
  }),
  route({
    method: 'patch',
    path: '/me/settings',
    rule: { who: 'signed in' },
    body: SettingsChange,
    handle: ({ context, body }) => changeSettings(context, body),
  }),
  route({
    method: 'put',
    path: '/me/password',
    rule: { who: 'signed in' },
    body: PasswordChange,
    answers: 'nothing',
    handle: ({ context, body, request }) =>
      changePassword(context, body, { sessionId: request.sessionID, machine: machineOf(request) }),
  }),
];
