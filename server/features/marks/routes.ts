import { CasePath } from '#shared/contracts/ids.ts';
import { FractographPath } from '#shared/contracts/fractographs.ts';
import { MarkChanged, MarkPath, MarkRemoved, MarkSent } from '#shared/contracts/marks.ts';
import { route } from '../../http/route.ts';
import { changeMark } from './service/change-mark.ts';
import { drawMark } from './service/draw-mark.ts';
import { listCaseMarks, listMarks, listVersions } from './service/list-marks.ts';
import { listMeasurements } from './service/list-measurements.ts';
import { removeMark, restoreMark } from './service/remove-mark.ts';

const ofFractograph = '/cases/:number/fractographs/:fractographId/marks';
const ofMark = `${ofFractograph}/:markId`;

export const markRoutes = [
  route({
    method: 'get',
    path: '/cases/:number/marks',
    rule: { who: 'may in case', act: 'read' },
    params: CasePath,
    handle: ({ context, heldCase }) => listCaseMarks(context, heldCase),
  }),
  route({
    method: 'get',
    path: '/cases/:number/measurements',
    rule: { who: 'may in case', act: 'read' },
    params: CasePath,
    handle: ({ context, heldCase }) => listMeasurements(context, heldCase),
  }),
  route({
    method: 'get',
    path: ofFractograph,
    rule: { who: 'may in case', act: 'read' },
    params: FractographPath,
    handle: ({ context, heldCase, params }) => listMarks(context, heldCase, params.fractographId),
  }),
  route({
    method: 'post',
    path: ofFractograph,
    rule: { who: 'may in case', act: 'mark' },
    params: FractographPath,
    body: MarkSent,
    answers: 'made',
    handle: ({ context, heldCase, params, body }) => drawMark(context, heldCase, params.fractographId, body),
  }),
  route({
    method: 'patch',
    path: ofMark,
    rule: { who: 'may in case', act: 'mark' },
    params: MarkPath,
    body: MarkChanged,
    handle: ({ context, heldCase, params, body }) => changeMark(context, heldCase, params, body),
  }),
  route({
    method: 'delete',
    path: ofMark,
    rule: { who: 'may in case', act: 'mark' },
    params: MarkPath,
    body: MarkRemoved,
    handle: ({ context, heldCase, params, body }) => removeMark(context, heldCase, params, body.versionSeen),
  }),
  route({
    method: 'post',
    path: `${ofMark}/restore`,
    rule: { who: 'may in case', act: 'mark' },
    params: MarkPath,
    body: MarkRemoved,
    handle: ({ context, heldCase, params, body }) => restoreMark(context, heldCase, params, body.versionSeen),
  }),
  route({
    method: 'get',
    path: `${ofMark}/versions`,
    rule: { who: 'may in case', act: 'read' },
    params: MarkPath,
    handle: ({ context, heldCase, params }) => listVersions(context, heldCase, params.markId),
  }),
];
