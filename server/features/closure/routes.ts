import { NoteAccepted, SentBack, SignatureGiven } from '#shared/contracts/closure.ts';
import { CasePath } from '#shared/contracts/ids.ts';
import { machineOf } from '../../http/limit-tries.ts';
import { route } from '../../http/route.ts';
import { acceptNote } from './service/accept-note.ts';
import { checkClosure } from './service/check-closure.ts';
import { loadReview } from './service/load-review.ts';
import { sendBack } from './service/send-back.ts';
import { sendToReview } from './service/send-to-review.ts';
import { signCase } from './service/sign-case.ts';

export const closureRoutes = [
  route({
    method: 'get',
    path: '/cases/:number/review',
    rule: { who: 'may in case', act: 'read' },
    params: CasePath,
    handle: ({ context, heldCase }) => loadReview(context, heldCase),
  }),
  route({
    method: 'get',
    path: '/cases/:number/review/check',
    rule: { who: 'may in case', act: 'read' },
    params: CasePath,
    handle: ({ context, heldCase }) => checkClosure(context, heldCase),
  }),
  route({
    method: 'post',
    path: '/cases/:number/review/send',
    rule: { who: 'may in case', act: 'send to review' },
    params: CasePath,
    answers: 'made',
    handle: ({ context, heldCase }) => sendToReview(context, heldCase),
  }),
  route({
    method: 'post',
    path: '/cases/:number/review/send-back',
    rule: { who: 'may in case', act: 'send back' },
    params: CasePath,
    body: SentBack,
    answers: 'nothing',
    handle: ({ context, heldCase, body }) => sendBack(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/review/notes/accept',
    rule: { who: 'may in case', act: 'accept a note' },
    params: CasePath,
    body: NoteAccepted,
    answers: 'nothing',
    handle: ({ context, heldCase, body }) => acceptNote(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/signatures',
    // The right is that of the meaning, which the body names; the service opens the case for it.
    rule: { who: 'may in case', act: 'read' },
    params: CasePath,
    body: SignatureGiven,
    answers: 'made',
    handle: ({ context, heldCase, body, request }) => signCase(context, heldCase, body, machineOf(request)),
  }),
];
