import { queryOptions } from '@tanstack/react-query';
import { FractographList } from '#shared/contracts/fractographs.ts';
import { read } from '../../../http/api.ts';

// An image that is still being cut is looked at again this often.
const againMs = 1500;

/** The fractographs of a case in the order of their figures, as the bench leafs through them. */
export const benchFractographsOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'fractographs'],
    queryFn: ({ signal }) => read(`/cases/${number}/fractographs`, FractographList, signal),
    refetchInterval: ({ state }) =>
      state.data?.some((each) => each.state !== 'ready' && each.state !== 'refused') ? againMs : false,
  });

/** Address under which the tiles of an image stand. */
export const tilesOf = (number: string, fractographId: string) =>
  `/api/cases/${number}/fractographs/${fractographId}/tiles`;
