import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  BindableList,
  BoundValueList,
  BoundValueView,
  FigureList,
  FigureView,
  FindingsVersionLine,
  FindingsVersionList,
  type FigureToPlace,
  type ValueToBind,
} from '#shared/contracts/findings.ts';
import { FractographList } from '#shared/contracts/fractographs.ts';
import { MarkList } from '#shared/contracts/marks.ts';
import { read, send } from '#src/http/api.ts';

const keyOf = (number: string, ...what: string[]) => ['case', number, 'findings', ...what];
const at = (number: string) => `/cases/${number}/findings`;

/** What every value bound in the case reads now. Constants change outside the case, so it is asked again at times. */
export const boundValuesOf = (number: string) =>
  queryOptions({
    queryKey: keyOf(number, 'values'),
    queryFn: ({ signal }) => read(`${at(number)}/bound-values`, BoundValueList, signal),
    refetchInterval: 60_000,
  });

export const bindableOf = (number: string) =>
  queryOptions({
    queryKey: keyOf(number, 'bindable'),
    queryFn: ({ signal }) => read(`${at(number)}/bindable-values`, BindableList, signal),
  });

export const figuresOf = (number: string) =>
  queryOptions({
    queryKey: keyOf(number, 'figures'),
    queryFn: ({ signal }) => read(`${at(number)}/figures`, FigureList, signal),
  });

export const versionsOf = (number: string) =>
  queryOptions({
    queryKey: keyOf(number, 'versions'),
    queryFn: ({ signal }) => read(`${at(number)}/versions`, FindingsVersionList, signal),
  });

/** The fractographs and marks a figure can be made of. */
export const imagesOf = (number: string) =>
  queryOptions({
    queryKey: keyOf(number, 'images'),
    queryFn: ({ signal }) => read(`/cases/${number}/fractographs`, FractographList, signal),
  });
export const marksOfCase = (number: string) =>
  queryOptions({
    queryKey: keyOf(number, 'marks'),
    queryFn: ({ signal }) => read(`/cases/${number}/marks`, MarkList, signal),
  });

/** The address of a figure as the server draws it. */
export const figureAddress = (number: string, figureId: string) => `/api${at(number)}/figures/${figureId}/image.svg`;

/** The acts on values, figures and versions; each reads the findings again, done or refused. */
export function useFindingsActs(number: string) {
  const client = useQueryClient();
  const onSettled = () => client.invalidateQueries({ queryKey: ['case', number] });
  const post = at(number);
  return {
    bind: useMutation({
      mutationFn: (wanted: ValueToBind) => send('POST', `${post}/bound-values`, wanted, BoundValueView),
      onSettled,
    }),
    renew: useMutation({
      mutationFn: (id: string) => send('POST', `${post}/bound-values/${id}/renew`, {}, BoundValueView),
      onSettled,
    }),
    keepOld: useMutation({
      mutationFn: ({ id, reason }: { id: string; reason: string }) =>
        send('POST', `${post}/bound-values/${id}/keep`, { reason }, BoundValueView),
      onSettled,
    }),
    place: useMutation({
      mutationFn: (wanted: FigureToPlace) => send('POST', `${post}/figures`, wanted, FigureView),
      onSettled,
    }),
    drawAgain: useMutation({
      mutationFn: (id: string) => send('POST', `${post}/figures/${id}/renew`, {}, FigureView),
      onSettled,
    }),
    keepVersion: useMutation({
      mutationFn: (name: string) => send('POST', `${post}/versions`, { name }, FindingsVersionLine),
      onSettled,
    }),
  };
}
