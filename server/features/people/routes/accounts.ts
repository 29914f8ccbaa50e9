import { z } from 'zod';
import {
  AccountChange,
  Invitation,
  OrganisationChange,
  OrganisationEntry,
  VersionSeen,
} from '#shared/contracts/people.ts';
import { route } from '../../../http/route.ts';
import { presentOrganisation } from '../present.ts';
import { changeAccount, closeAccount, openAccountAgain } from '../service/accounts.ts';
import { inviteAgain, invitePerson, takeInvitationBack } from '../service/invitations.ts';
import { listAccounts, listEnteredOrganisations, listStaff } from '../service/list-people.ts';
import { changeOrganisation, enterOrganisation } from '../service/organisations.ts';

const PersonPath = z.object({ personId: z.uuid() });
const OrganisationPath = z.object({ organisationId: z.uuid() });
const administrators = { who: 'may', act: 'keep people' } as const;
const staff = { who: 'may', act: 'read people' } as const;

/** The laboratory's people and organisations, as an administrator keeps them. */
export const accountRoutes = [
  route({ method: 'get', path: '/staff', rule: staff, handle: ({ context }) => listStaff(context) }),
  route({
    method: 'get',
    path: '/organisations',
    rule: staff,
    handle: ({ context }) => listEnteredOrganisations(context),
  }),
  route({
    method: 'post',
    path: '/organisations',
    rule: administrators,
    body: OrganisationEntry,
    answers: 'made',
    handle: async ({ context, body }) => presentOrganisation(await enterOrganisation(context, body)),
  }),
  route({
    method: 'patch',
    path: '/organisations/:organisationId',
    rule: administrators,
    params: OrganisationPath,
    body: OrganisationChange,
    handle: async ({ context, params, body }) =>
      presentOrganisation(await changeOrganisation(context, params.organisationId, body)),
  }),
  route({ method: 'get', path: '/people', rule: administrators, handle: ({ context }) => listAccounts(context) }),
  route({
    method: 'post',
    path: '/people',
    rule: administrators,
    body: Invitation,
    answers: 'made',
    handle: async ({ context, body }) => ({ id: await invitePerson(context, body) }),
  }),
  route({
    method: 'patch',
    path: '/people/:personId',
    rule: administrators,
    params: PersonPath,
    body: AccountChange,
    answers: 'nothing',
    handle: ({ context, params, body }) => changeAccount(context, params.personId, body),
  }),
  route({
    method: 'post',
    path: '/people/:personId/closing',
    rule: administrators,
    params: PersonPath,
    body: VersionSeen,
    answers: 'nothing',
    handle: ({ context, params, body }) => closeAccount(context, params.personId, body),
  }),
  route({
    method: 'post',
    path: '/people/:personId/opening',
    rule: administrators,
    params: PersonPath,
    body: VersionSeen,
    answers: 'nothing',
    handle: ({ context, params, body }) => openAccountAgain(context, params.personId, body),
  }),
  route({
    method: 'post',
    path: '/people/:personId/invitation',
    rule: administrators,
    params: PersonPath,
    answers: 'nothing',
    handle: ({ context, params }) => inviteAgain(context, params.personId),
  }),
  route({
    method: 'delete',
    path: '/people/:personId/invitation',
    rule: administrators,
    params: PersonPath,
    answers: 'nothing',
    handle: ({ context, params }) => takeInvitationBack(context, params.personId),
  }),
];
