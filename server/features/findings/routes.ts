import {
  BoundValuePath,
  FigurePath,
  FigureToPlace,
  OldKept,
  ValueToBind,
  VersionPath,
  VersionToKeep,
} from '#shared/contracts/findings.ts';
import { CasePath } from '#shared/contracts/ids.ts';
import { route } from '../../http/route.ts';
import { sendPicture } from '../../http/send-picture.ts';
import { bindValue } from './service/bind-value.ts';
import { keepOldValue, renewValue } from './service/renew-value.ts';
import { listBindable } from './service/list-bindable.ts';
import { drawFigure, listFigures } from './service/list-figures.ts';
import { drawAgain, placeFigure } from './service/place-figure.ts';
import { findFindingsFacts } from './service/read-text.ts';
import { listVersions, loadVersion, nameVersion } from './service/keep-version.ts';
import { resolveValues } from './service/resolve-values.ts';

const read = { who: 'may in case', act: 'read' } as const;
const write = { who: 'may in case', act: 'write findings' } as const;
const ofCase = '/cases/:number/findings';
const values = `${ofCase}/bound-values`;
const figures = `${ofCase}/figures`;
const versions = `${ofCase}/versions`;

export const findingsRoutes = [
  route({
    method: 'get',
    path: `${ofCase}/facts`,
    rule: read,
    params: CasePath,
    handle: ({ context, heldCase }) => findFindingsFacts(context.reader, heldCase),
  }),
  route({
    method: 'get',
    path: `${ofCase}/bindable-values`,
    rule: read,
    params: CasePath,
    handle: ({ context, heldCase }) => listBindable(context.reader, heldCase),
  }),
  route({
    method: 'get',
    path: values,
    rule: read,
    params: CasePath,
    handle: ({ context, heldCase }) => resolveValues(context.reader, heldCase),
  }),
  route({
    method: 'post',
    path: values,
    rule: write,
    params: CasePath,
    body: ValueToBind,
    answers: 'made',
    handle: ({ context, heldCase, body }) => bindValue(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: `${values}/:boundValueId/renew`,
    rule: write,
    params: BoundValuePath,
    answers: 'made',
    handle: ({ context, heldCase, params }) => renewValue(context, heldCase, params.boundValueId),
  }),
  route({
    method: 'post',
    path: `${values}/:boundValueId/keep`,
    rule: write,
    params: BoundValuePath,
    body: OldKept,
    handle: ({ context, heldCase, params, body }) => keepOldValue(context, heldCase, params.boundValueId, body.reason),
  }),
  route({
    method: 'get',
    path: figures,
    rule: read,
    params: CasePath,
    handle: ({ context, heldCase }) => listFigures(context.reader, heldCase),
  }),
  route({
    method: 'post',
    path: figures,
    rule: write,
    params: CasePath,
    body: FigureToPlace,
    answers: 'made',
    handle: ({ context, heldCase, body }) => placeFigure(context, heldCase, body),
  }),
  route({
    method: 'post',
    path: `${figures}/:figureId/renew`,
    rule: write,
    params: FigurePath,
    answers: 'made',
    handle: ({ context, heldCase, params }) => drawAgain(context, heldCase, params.figureId),
  }),
  route({
    method: 'get',
    path: `${figures}/:figureId/image.svg`,
    rule: read,
    params: FigurePath,
    handle: async ({ context, heldCase, params, request, response }) =>
      sendPicture(request, response, await drawFigure(context, heldCase, params.figureId)),
  }),
  route({
    method: 'get',
    path: versions,
    rule: read,
    params: CasePath,
    handle: ({ context, heldCase }) => listVersions(context, heldCase),
  }),
  route({
    method: 'post',
    path: versions,
    rule: write,
    params: CasePath,
    body: VersionToKeep,
    answers: 'made',
    handle: ({ context, heldCase, body }) => nameVersion(context, heldCase, body.name),
  }),
  route({
    method: 'get',
    path: `${versions}/:versionNumber`,
    rule: read,
    params: VersionPath,
    handle: ({ context, heldCase, params }) => loadVersion(context, heldCase, params.versionNumber),
  }),
];
