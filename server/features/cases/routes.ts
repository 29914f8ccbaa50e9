import {
  BackgroundChanged,
  BackgroundGiven,
  BackgroundPath,
  BackgroundTakenBack,
  CaseChanged,
  CaseGiven,
  CaseHeld,
  CaseMoved,
  CaseOpened,
  CaseRestricted,
  CaseResumed,
  CaseTaken,
  CaseWithdrawn,
  HistoryQuery,
  QuestionsAgreed,
} from '#shared/contracts/cases.ts';
import { CasebookQuery } from '#shared/contracts/casebook.ts';
import { route } from '../../http/route.ts';
import { agreeQuestions, listQuestions } from './service/agree-questions.ts';
import { changeCase } from './service/change-case.ts';
import { giveCase, takeCase } from './service/give-case.ts';
import { holdCase, resumeCase } from './service/hold-case.ts';
import { addStatement, changeStatement, listStatements, takeBackStatement } from './service/keep-background.ts';
import { countCases, listCasebook } from './service/list-casebook.ts';
import { listChoices } from './service/list-choices.ts';
import { listHistory } from './service/list-history.ts';
import { loadCase } from './service/load-case.ts';
import { moveCaseByHand } from './service/move-case.ts';
import { openNewCase } from './service/open-a-case.ts';
import { restrictCase } from './service/restrict-case.ts';
import { withdrawCase } from './service/withdraw-case.ts';

const casebookRoutes = [
  route({
    method: 'get',
    path: '/cases',
    rule: { who: 'may', act: 'see the casebook' },
    query: CasebookQuery,
    handle: ({ context, query }) => listCasebook(context, query),
  }),
  route({
    method: 'get',
    path: '/casebook/counts',
    rule: { who: 'may', act: 'see the casebook' },
    handle: ({ context }) => countCases(context),
  }),
  route({
    method: 'get',
    path: '/casebook/choices',
    rule: { who: 'may', act: 'read people' },
    handle: ({ context }) => listChoices(context.reader),
  }),
  route({
    method: 'post',
    path: '/cases',
    rule: { who: 'may', act: 'open a case' },
    body: CaseOpened,
    answers: 'made',
    handle: ({ context, body }) => openNewCase(context, body),
  }),
];

const actRoutes = [
  route({
    method: 'get',
    path: '/cases/:number',
    rule: { who: 'may in case', act: 'follow' },
    handle: ({ context, heldCase }) => loadCase(context, heldCase),
  }),
  route({
    method: 'patch',
    path: '/cases/:number',
    rule: { who: 'may in case', act: 'edit' },
    body: CaseChanged,
    handle: ({ context, heldCase, body }) => changeCase(context, heldCase, body),
  }),
  route({
    method: 'put',
    path: '/cases/:number/holder',
    rule: { who: 'may in case', act: 'assign' },
    body: CaseGiven,
    handle: ({ context, heldCase, body }) => giveCase(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/taken',
    rule: { who: 'may in case', act: 'take' },
    body: CaseTaken,
    handle: ({ context, heldCase, body }) => takeCase(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/moves',
    rule: { who: 'may in case', act: 'move' },
    body: CaseMoved,
    handle: ({ context, heldCase, body }) => moveCaseByHand(context, heldCase, body),
  }),
  route({
    method: 'put',
    path: '/cases/:number/hold',
    rule: { who: 'may in case', act: 'hold' },
    body: CaseHeld,
    handle: ({ context, heldCase, body }) => holdCase(context, heldCase, body),
  }),
  route({
    method: 'delete',
    path: '/cases/:number/hold',
    rule: { who: 'may in case', act: 'resume' },
    body: CaseResumed,
    handle: ({ context, heldCase, body }) => resumeCase(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/withdrawal',
    rule: { who: 'may in case', act: 'withdraw' },
    body: CaseWithdrawn,
    handle: ({ context, heldCase, body }) => withdrawCase(context, heldCase, body),
  }),
  route({
    method: 'put',
    path: '/cases/:number/restriction',
    rule: { who: 'may in case', act: 'restrict' },
    body: CaseRestricted,
    handle: ({ context, heldCase, body }) => restrictCase(context, heldCase, body),
  }),
];

const intakeRoutes = [
  route({
    method: 'get',
    path: '/cases/:number/questions',
    rule: { who: 'may in case', act: 'read' },
    handle: ({ context, heldCase }) => listQuestions(context.reader, heldCase),
  }),
  route({
    method: 'post',
    path: '/cases/:number/questions',
    rule: { who: 'may in case', act: 'edit' },
    body: QuestionsAgreed,
    answers: 'made',
    handle: ({ context, heldCase, body }) => agreeQuestions(context, heldCase, body),
  }),
  route({
    method: 'get',
    path: '/cases/:number/background',
    rule: { who: 'may in case', act: 'read' },
    handle: ({ context, heldCase }) => listStatements(context.reader, heldCase),
  }),
  route({
    method: 'post',
    path: '/cases/:number/background',
    rule: { who: 'may in case', act: 'edit' },
    body: BackgroundGiven,
    answers: 'made',
    handle: ({ context, heldCase, body }) => addStatement(context, heldCase, body),
  }),
  route({
    method: 'put',
    path: '/cases/:number/background/:backgroundId',
    rule: { who: 'may in case', act: 'edit' },
    params: BackgroundPath,
    body: BackgroundChanged,
    handle: ({ context, heldCase, params, body }) =>
      changeStatement(context, heldCase, { id: params.backgroundId, change: body }),
  }),
  route({
    method: 'delete',
    path: '/cases/:number/background/:backgroundId',
    rule: { who: 'may in case', act: 'edit' },
    params: BackgroundPath,
    body: BackgroundTakenBack,
    handle: ({ context, heldCase, params, body }) =>
      takeBackStatement(context, heldCase, { id: params.backgroundId, change: body }),
  }),
  route({
    method: 'get',
    path: '/cases/:number/history',
    rule: { who: 'may in case', act: 'read' },
    query: HistoryQuery,
    handle: ({ context, heldCase, query }) => listHistory(context.reader, heldCase, query.before),
  }),
];

export const caseRoutes = [...casebookRoutes, ...actRoutes, ...intakeRoutes];
