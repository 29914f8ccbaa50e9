import { queryOptions } from '@tanstack/react-query';
import { MarkList, MarkVersionList, MarkView, type MarkChanged, type MarkSent } from '#shared/contracts/marks.ts';
import { read, send } from '../../http/api.ts';
import { queryClient } from '../../http/query-client.ts';

const pathOf = (number: string, fractographId: string) => `/cases/${number}/fractographs/${fractographId}/marks`;

/** The marks of one fractograph, those taken off among them. */
export const marksOf = (number: string, fractographId: string) =>
  queryOptions({
    queryKey: ['case', number, 'fractographs', fractographId, 'marks'],
    queryFn: ({ signal }) => read(pathOf(number, fractographId), MarkList, signal),
  });

/** Every state one mark has had, newest first. */
export const markVersionsOf = (number: string, fractographId: string, markId: string) =>
  queryOptions({
    queryKey: ['case', number, 'fractographs', fractographId, 'marks', markId, 'versions'],
    queryFn: ({ signal }) => read(`${pathOf(number, fractographId)}/${markId}/versions`, MarkVersionList, signal),
  });

/** How acts on the marks of one fractograph reach the server. */
export function markCalls(number: string, fractographId: string) {
  const path = pathOf(number, fractographId);
  const key = marksOf(number, fractographId).queryKey;
  return {
    draw: (mark: MarkSent, actId: string) => send('POST', path, mark, MarkView, actId),
    change: (markId: string, change: MarkChanged, actId: string) =>
      send('PATCH', `${path}/${markId}`, change, MarkView, actId),
    remove: (markId: string, versionSeen: number, actId: string) =>
      send('DELETE', `${path}/${markId}`, { versionSeen }, MarkView, actId),
    restore: (markId: string, versionSeen: number, actId: string) =>
      send('POST', `${path}/${markId}/restore`, { versionSeen }, MarkView, actId),
    keep: (mark: MarkView) =>
      void queryClient.setQueryData(key, (marks: MarkView[] | undefined) => withMark(marks ?? [], mark)),
    refetch: () => queryClient.invalidateQueries({ queryKey: key }),
  };
}

/** A newer state takes the place of an older one; an older one that comes late changes nothing. */
function withMark(marks: readonly MarkView[], mark: MarkView): MarkView[] {
  const known = marks.find(({ id }) => id === mark.id);
  if (known && known.version > mark.version) return [...marks];
  return [...marks.filter(({ id }) => id !== mark.id), mark].sort((one, other) => one.number - other.number);
}
