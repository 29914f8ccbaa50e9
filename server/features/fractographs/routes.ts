import {
  CropQuery,
  FractographDescribed,
  FractographFields,
  FractographPath,
  PreviewQuery,
  ScaleBinding,
  TilePath,
} from '#shared/contracts/fractographs.ts';
import { parse } from '../../http/parse.ts';
import { receiveFile, sendStream } from '../../http/receive-file.ts';
import { route, sent } from '../../http/route.ts';
import { sendPicture } from '../../http/send-picture.ts';
import { bindScale } from './service/bind-scale.ts';
import { describeFractograph } from './service/describe-fractograph.ts';
import { listFractographs, loadFractograph } from './service/find-fractographs.ts';
import { listScaleHistory } from './service/find-scale.ts';
import { findCrop, findOriginal, findPreview, findTile } from './service/read-pictures.ts';
import { keepingNothingOnFailure, receiveFractograph } from './service/receive-fractograph.ts';

const mayRead = { who: 'may in case', act: 'read' } as const;
const mayBringIn = { who: 'may in case', act: 'bring in fractographs' } as const;
const ofCase = '/cases/:number/fractographs';
const one = `${ofCase}/:fractographId`;

export const fractographRoutes = [
  route({
    method: 'get',
    path: ofCase,
    rule: mayRead,
    handle: ({ context, heldCase }) => listFractographs(context.reader, heldCase),
  }),
  route({
    method: 'post',
    path: ofCase,
    rule: mayBringIn,
    answers: 'accepted',
    handle: async ({ context, heldCase, request, response }) => {
      const { largestFileBytes } = context.limits;
      const { file, fields } = await receiveFile(request, response, context.storage, largestFileBytes);
      return keepingNothingOnFailure(context, file.sha256, async () =>
        receiveFractograph(context, heldCase, file, parse(FractographFields, fields)),
      );
    },
  }),
  route({
    method: 'get',
    path: one,
    rule: mayRead,
    params: FractographPath,
    handle: ({ context, heldCase, params }) => loadFractograph(context.reader, heldCase, params.fractographId),
  }),
  route({
    method: 'patch',
    path: one,
    rule: mayBringIn,
    params: FractographPath,
    body: FractographDescribed,
    handle: ({ context, heldCase, params, body }) => describeFractograph(context, heldCase, params.fractographId, body),
  }),
  route({
    method: 'get',
    path: `${one}/tiles/:level/:place`,
    rule: mayRead,
    params: TilePath,
    handle: async ({ context, heldCase, params, request, response }) => {
      const of = { context, heldCase, id: params.fractographId };
      return sendPicture(request, response, await findTile(of, params.level, params.place));
    },
  }),
  route({
    method: 'get',
    path: `${one}/preview`,
    rule: mayRead,
    params: FractographPath,
    query: PreviewQuery,
    handle: async ({ context, heldCase, params, query, request, response }) => {
      const of = { context, heldCase, id: params.fractographId };
      return sendPicture(request, response, await findPreview(of, query.width));
    },
  }),
  route({
    method: 'get',
    path: `${one}/crop`,
    rule: mayRead,
    params: FractographPath,
    query: CropQuery,
    handle: async ({ context, heldCase, params, query, request, response }) => {
      const of = { context, heldCase, id: params.fractographId };
      return sendPicture(request, response, await findCrop(of, query));
    },
  }),
  route({
    method: 'get',
    path: `${one}/original`,
    rule: mayRead,
    params: FractographPath,
    handle: async ({ context, heldCase, params, response }) => {
      const original = await findOriginal({ context, heldCase, id: params.fractographId });
      response.attachment(original.fileName).type('application/octet-stream');
      response.set({
        'X-SHA256': original.sha256,
        'Content-Length': String(original.bytes),
        'Cache-Control': 'private',
      });
      await sendStream(original.stream, response);
      return sent;
    },
  }),
  route({
    method: 'get',
    path: `${one}/calibrations`,
    rule: mayRead,
    params: FractographPath,
    handle: async ({ context, heldCase, params }) => {
      const { id } = await loadFractograph(context.reader, heldCase, params.fractographId);
      return listScaleHistory(context.reader, id);
    },
  }),
  route({
    method: 'post',
    path: `${one}/calibrations`,
    rule: { who: 'may in case', act: 'calibrate' },
    params: FractographPath,
    body: ScaleBinding,
    answers: 'made',
    handle: ({ context, heldCase, params, body }) => bindScale(context, heldCase, params.fractographId, body),
  }),
];
