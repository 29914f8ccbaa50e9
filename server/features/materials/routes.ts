import {
  ConstantPath,
  ConstantsQuery,
  ConstantTyped,
  MaterialChanged,
  MaterialEntered,
  MaterialPath,
} from '#shared/contracts/materials.ts';
import { route } from '../../http/route.ts';
import { changeMaterial, enterMaterial, listMaterials, loadMaterial } from './service/keep-material.ts';
import { listConstantsInForce, loadReach } from './service/list-constants.ts';
import { recordConstant } from './service/record-constant.ts';

export const materialRoutes = [
  route({
    method: 'get',
    path: '/materials',
    rule: { who: 'may', act: 'read materials' },
    handle: ({ context }) => listMaterials(context.reader),
  }),
  route({
    method: 'post',
    path: '/materials',
    rule: { who: 'may', act: 'enter materials' },
    body: MaterialEntered,
    answers: 'made',
    handle: ({ context, body }) => enterMaterial(context, body),
  }),
  route({
    method: 'get',
    path: '/materials/:materialId',
    rule: { who: 'may', act: 'read materials' },
    params: MaterialPath,
    handle: ({ context, params }) => loadMaterial(context, params.materialId),
  }),
  route({
    method: 'patch',
    path: '/materials/:materialId',
    rule: { who: 'may', act: 'enter materials' },
    params: MaterialPath,
    body: MaterialChanged,
    handle: ({ context, params, body }) => changeMaterial(context, params.materialId, body),
  }),
  route({
    method: 'get',
    path: '/materials/:materialId/constants',
    rule: { who: 'may', act: 'read materials' },
    params: MaterialPath,
    query: ConstantsQuery,
    handle: ({ context, params, query }) => listConstantsInForce(context.reader, params.materialId, query.on),
  }),
  route({
    method: 'post',
    path: '/materials/:materialId/constants',
    rule: { who: 'may', act: 'record constants' },
    params: MaterialPath,
    body: ConstantTyped,
    answers: 'made',
    handle: ({ context, params, body }) => recordConstant(context, params.materialId, body),
  }),
  route({
    method: 'get',
    path: '/materials/:materialId/constants/:constantId/reach',
    rule: { who: 'may', act: 'record constants' },
    params: ConstantPath,
    handle: ({ context, params }) => loadReach(context, params),
  }),
];
