import { z } from 'zod';
import { MailQuery, TrailQuery } from '#shared/contracts/laboratory.ts';
import { route } from '../../http/route.ts';
import { checkTrail } from './service/check-trail.ts';
import { lookIn } from './service/look-in.ts';
import { listHeldMails, listMails, openHeldMail, sendMailAgain } from './service/mails.ts';
import { readTrail } from './service/trail.ts';

const MailPath = z.object({ mailId: z.uuid() });
const mailReaders = { who: 'may', act: 'read mail' } as const;
const trailReaders = { who: 'may', act: 'read the trail' } as const;

/** The place where an administrator keeps the laboratory. */
export const laboratoryRoutes = [
  route({
    method: 'get',
    path: '/laboratory',
    rule: { who: 'may', act: 'keep people' },
    handle: ({ context }) => lookIn(context),
  }),
  route({
    method: 'get',
    path: '/mail',
    rule: mailReaders,
    query: MailQuery,
    handle: ({ context, query }) => listMails(context, query.before),
  }),
  route({
    method: 'post',
    path: '/mail/:mailId/again',
    rule: mailReaders,
    params: MailPath,
    answers: 'nothing',
    handle: ({ context, params }) => sendMailAgain(context, params.mailId),
  }),
  route({
    method: 'get',
    path: '/held-mail',
    rule: mailReaders,
    query: MailQuery,
    handle: ({ context, query }) => listHeldMails(context, query.before),
  }),
  route({
    method: 'post',
    path: '/held-mail/:mailId/opening',
    rule: mailReaders,
    params: MailPath,
    handle: ({ context, params }) => openHeldMail(context, params.mailId),
  }),
  route({
    method: 'get',
    path: '/trail',
    rule: trailReaders,
    query: TrailQuery,
    handle: ({ context, query }) => readTrail(context, query),
  }),
  route({
    method: 'get',
    path: '/trail/check',
    rule: trailReaders,
    handle: ({ context }) => checkTrail(context),
  }),
];
