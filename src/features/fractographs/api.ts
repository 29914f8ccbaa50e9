import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { CalibrationList, InstrumentList } from '#shared/contracts/calibrations.ts';
import { EvidenceView } from '#shared/contracts/evidence.ts';
import {
  FractographList,
  FractographView,
  ScaleHistory,
  type FractographDescribed,
  type ScaleBinding,
} from '#shared/contracts/fractographs.ts';
import { read, send } from '#src/http/api.ts';

// An image that is still being checked or cut is asked for again this often.
const againMs = 1000;

/** The fractographs of a case; while one is still unsettled they are read again every second. */
export const fractographsOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'fractographs'],
    queryFn: ({ signal }) => read(`/cases/${number}/fractographs`, FractographList, signal),
    refetchInterval: ({ state }) => (state.data?.some(isUnsettled) ? againMs : false),
  });

export function isUnsettled({ state }: FractographView): boolean {
  return state !== 'ready' && state !== 'refused';
}

/** Every scale an image was ever bound to, newest first. */
export const scaleHistoryOf = (number: string, fractographId: string) =>
  queryOptions({
    queryKey: ['case', number, 'fractographs', fractographId, 'scales'],
    queryFn: ({ signal }) => read(`/cases/${number}/fractographs/${fractographId}/calibrations`, ScaleHistory, signal),
  });

/** Instruments of the laboratory, to say what an image was taken with. */
export const instrumentsOffered = queryOptions({
  queryKey: ['laboratory', 'instruments'],
  queryFn: ({ signal }) => read('/laboratory/instruments', InstrumentList, signal),
});

/** Calibrations the laboratory keeps; replaced ones are among them. */
export const calibrationsOffered = queryOptions({
  queryKey: ['laboratory', 'calibrations'],
  queryFn: ({ signal }) => read('/laboratory/calibrations', CalibrationList, signal),
});

/** The pieces of the case that an image may be of. */
export const piecesOffered = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'evidence'],
    queryFn: ({ signal }) => read(`/cases/${number}/evidence`, EvidenceView, signal),
  });

/** Keeps what is said of a fractograph. */
export function useDescribe(number: string, fractographId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (described: FractographDescribed) =>
      send('PATCH', `/cases/${number}/fractographs/${fractographId}`, described, FractographView),
    onSettled: () => client.invalidateQueries({ queryKey: ['case', number] }),
  });
}

/** Binds an image to a scale; everything of the case that hangs on it is read again. */
export function useBindScale(number: string, fractographId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (binding: ScaleBinding) =>
      send('POST', `/cases/${number}/fractographs/${fractographId}/calibrations`, binding, FractographView),
    onSettled: () => client.invalidateQueries({ queryKey: ['case', number] }),
  });
}

export const previewOf = (number: string, fractographId: string, width: number) =>
  `/api/cases/${number}/fractographs/${fractographId}/preview?width=${width}`;
