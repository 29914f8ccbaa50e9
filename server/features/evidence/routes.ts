import {
  FacesPaired,
  FacesParted,
  MatePath,
  MissingNoted,
  PartChange,
  PartDetails,
  PartPath,
  PieceChange,
  PiecePath,
  PieceReceived,
} from '#shared/contracts/evidence.ts';
import { CasePath } from '#shared/contracts/ids.ts';
import { route } from '../../http/route.ts';
import { changePart } from './service/change-part.ts';
import { changePiece } from './service/change-piece.ts';
import { enterPart } from './service/enter-part.ts';
import { noteMissing } from './service/note-missing.ts';
import { pairFaces } from './service/pair-faces.ts';
import { partFaces } from './service/part-faces.ts';
import { readEvidence } from './service/read-evidence.ts';
import { receivePiece } from './service/receive-piece.ts';

const change = { who: 'may in case', act: 'change evidence' } as const;

export const evidenceRoutes = [
  route({
    method: 'get',
    path: '/cases/:number/evidence',
    rule: { who: 'may in case', act: 'read' },
    params: CasePath,
    handle: ({ context, heldCase }) => readEvidence(context, heldCase),
  }),
  route({
    method: 'post',
    path: '/cases/:number/evidence/parts',
    rule: change,
    params: CasePath,
    body: PartDetails,
    answers: 'made',
    handle: ({ context, heldCase, body }) => enterPart(context, heldCase, body),
  }),
  route({
    method: 'put',
    path: '/cases/:number/evidence/parts/:partId',
    rule: change,
    params: PartPath,
    body: PartChange,
    handle: ({ context, heldCase, params, body }) => changePart(context, heldCase, params.partId, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/evidence/pieces',
    rule: change,
    params: CasePath,
    body: PieceReceived,
    answers: 'made',
    handle: ({ context, heldCase, body }) => receivePiece(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/evidence/missing',
    rule: change,
    params: CasePath,
    body: MissingNoted,
    answers: 'made',
    handle: ({ context, heldCase, body }) => noteMissing(context, heldCase, body),
  }),
  route({
    method: 'put',
    path: '/cases/:number/evidence/pieces/:pieceId',
    rule: change,
    params: PiecePath,
    body: PieceChange,
    handle: ({ context, heldCase, params, body }) => changePiece(context, heldCase, params.pieceId, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/evidence/mates',
    rule: change,
    params: CasePath,
    body: FacesPaired,
    answers: 'made',
    handle: ({ context, heldCase, body }) => pairFaces(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: '/cases/:number/evidence/mates/:mateId/parting',
    rule: change,
    params: MatePath,
    body: FacesParted,
    handle: ({ context, heldCase, params, body }) => partFaces(context, heldCase, params.mateId, body),
  }),
];
