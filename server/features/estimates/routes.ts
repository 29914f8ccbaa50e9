import {
  EstimatePath,
  EstimateRenewed,
  EstimateWanted,
  OldValueKept,
  StandingChanged,
} from '#shared/contracts/estimates.ts';
import { VerdictsAsked } from '#shared/contracts/casebook-verdicts.ts';
import { CasePath } from '#shared/contracts/ids.ts';
import { ReckoningsWanted } from '#shared/contracts/reckonings.ts';
import { route } from '../../http/route.ts';
import { listEstimates, loadEstimateView } from './service/list-estimates.ts';
import { listVerdicts } from './service/list-verdicts.ts';
import { makeEstimate } from './service/make-estimate.ts';
import { recomputeEstimate } from './service/recompute-estimate.ts';
import { reckonList } from './service/reckon-list.ts';
import { renewEstimate } from './service/renew-estimate.ts';
import { changeStanding, keepOldValue } from './service/settle-estimate.ts';

export const estimateRoutes = [
  route({
    method: 'get',
    path: '/casebook/verdicts',
    rule: { who: 'may', act: 'see the casebook' },
    query: VerdictsAsked,
    handle: ({ context, query }) => listVerdicts(context, query.numbers),
  }),
  route({
    method: 'get',
    path: '/cases/:number/estimates',
    rule: { who: 'may in case', act: 'read' },
    params: CasePath,
    handle: ({ context, heldCase }) => listEstimates(context.reader, heldCase),
  }),
  route({
    method: 'post',
    path: '/cases/:number/estimates',
    rule: { who: 'may in case', act: 'estimate' },
    params: CasePath,
    body: EstimateWanted,
    answers: 'made',
    handle: async ({ context, heldCase, body }) =>
      loadEstimateView(context.reader, heldCase, await makeEstimate(context, heldCase, body)),
  }),
  route({
    method: 'get',
    path: '/cases/:number/estimates/:estimateId',
    rule: { who: 'may in case', act: 'read' },
    params: EstimatePath,
    handle: ({ context, heldCase, params }) => loadEstimateView(context.reader, heldCase, params.estimateId),
  }),
  route({
    method: 'get',
    path: '/cases/:number/estimates/:estimateId/recomputed',
    rule: { who: 'may in case', act: 'read' },
    params: EstimatePath,
    handle: async ({ context, heldCase, params }) => {
      const { id } = await loadEstimateView(context.reader, heldCase, params.estimateId);
      return recomputeEstimate(context.reader, id);
    },
  }),
  route({
    method: 'post',
    path: '/cases/:number/estimates/:estimateId/renewed',
    rule: { who: 'may in case', act: 'estimate' },
    params: EstimatePath,
    body: EstimateRenewed,
    answers: 'made',
    handle: async ({ context, heldCase, params, body }) =>
      loadEstimateView(context.reader, heldCase, await renewEstimate(context, heldCase, params.estimateId, body)),
  }),
  route({
    method: 'post',
    path: '/cases/:number/estimates/:estimateId/kept',
    rule: { who: 'may in case', act: 'estimate' },
    params: EstimatePath,
    body: OldValueKept,
    handle: async ({ context, heldCase, params, body }) => {
      await keepOldValue(context, heldCase, params.estimateId, body);
      return loadEstimateView(context.reader, heldCase, params.estimateId);
    },
  }),
  route({
    method: 'post',
    path: '/cases/:number/estimates/:estimateId/standing',
    rule: { who: 'may in case', act: 'estimate' },
    params: EstimatePath,
    body: StandingChanged,
    handle: async ({ context, heldCase, params, body }) => {
      await changeStanding(context, heldCase, params.estimateId, body);
      return loadEstimateView(context.reader, heldCase, params.estimateId);
    },
  }),
  route({
    method: 'post',
    path: '/reckonings',
    rule: { who: 'may', act: 'reckon' },
    body: ReckoningsWanted,
    handle: ({ body }) => Promise.resolve(reckonList(body)),
  }),
];
