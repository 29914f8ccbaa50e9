import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { CalibrationList, CalibrationReach, InstrumentList } from '#shared/contracts/calibrations.ts';
import { read, send } from '#src/http/api.ts';

export const instrumentsQuery = queryOptions({
  queryKey: ['laboratory', 'instruments'],
  queryFn: ({ signal }) => read('/laboratory/instruments', InstrumentList, signal),
});

export const calibrationsQuery = queryOptions({
  queryKey: ['laboratory', 'calibrations'],
  queryFn: ({ signal }) => read('/laboratory/calibrations', CalibrationList, signal),
});

/** What hangs on a calibration, asked for before it is replaced. */
export const reachOf = (calibrationId: string) =>
  queryOptions({
    queryKey: ['laboratory', 'calibrations', calibrationId, 'reach'],
    queryFn: ({ signal }) => read(`/laboratory/calibrations/${calibrationId}/reach`, CalibrationReach, signal),
  });

/** Sends one act on instruments or calibrations and reads both lists again. */
export function useInstrumentAct<Schema extends z.ZodType>(path: string, schema: Schema) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: unknown) => send('POST', path, body, schema),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: instrumentsQuery.queryKey }),
        client.invalidateQueries({ queryKey: calibrationsQuery.queryKey }),
        client.invalidateQueries({ queryKey: ['case'] }),
      ]),
  });
}
