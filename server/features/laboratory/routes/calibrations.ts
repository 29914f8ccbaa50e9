import {
  CalibrationEntered,
  CalibrationPath,
  CalibrationReplaced,
  InstrumentEntered,
} from '#shared/contracts/calibrations.ts';
import { route } from '../../../http/route.ts';
import { presentCalibration, presentInstrument } from '../present/calibrations.ts';
import { findReach, listInstruments, listKeptCalibrations, loadKeptCalibration } from '../service/find-calibrations.ts';
import { enterInstrument, recordCalibration, replaceCalibration } from '../service/record-calibration.ts';

const mayRead = { who: 'may', act: 'read calibrations' } as const;
const mayRecord = { who: 'may', act: 'record calibrations' } as const;

export const calibrationRoutes = [
  route({
    method: 'get',
    path: '/laboratory/instruments',
    rule: mayRead,
    handle: async ({ context }) => (await listInstruments(context.reader)).map(presentInstrument),
  }),
  route({
    method: 'post',
    path: '/laboratory/instruments',
    rule: mayRecord,
    body: InstrumentEntered,
    answers: 'made',
    handle: async ({ context, body }) => presentInstrument(await enterInstrument(context, body)),
  }),
  route({
    method: 'get',
    path: '/laboratory/calibrations',
    rule: mayRead,
    handle: async ({ context }) => (await listKeptCalibrations(context.reader)).map(presentCalibration),
  }),
  route({
    method: 'post',
    path: '/laboratory/calibrations',
    rule: mayRecord,
    body: CalibrationEntered,
    answers: 'made',
    handle: async ({ context, body }) => {
      const { id } = await recordCalibration(context, body);
      return presentCalibration(await loadKeptCalibration(context.reader, id));
    },
  }),
  route({
    method: 'get',
    path: '/laboratory/calibrations/:calibrationId/reach',
    rule: mayRead,
    params: CalibrationPath,
    handle: ({ context, params }) => findReach(context, params.calibrationId),
  }),
  route({
    method: 'post',
    path: '/laboratory/calibrations/:calibrationId/replacement',
    rule: mayRecord,
    params: CalibrationPath,
    body: CalibrationReplaced,
    answers: 'made',
    handle: async ({ context, params, body }) => {
      const { calibration } = await replaceCalibration(context, params.calibrationId, body);
      return presentCalibration(await loadKeptCalibration(context.reader, calibration.id));
    },
  }),
];
