import { queryOptions, useMutation } from '@tanstack/react-query';
import { CasebookVerdicts } from '#shared/contracts/casebook-verdicts.ts';
import { EstimatesView, EstimateView, type EstimateWantedInput } from '#shared/contracts/estimates.ts';
import { MeasurementList } from '#shared/contracts/marks.ts';
import { MaterialList, MaterialWithConstants } from '#shared/contracts/materials.ts';
import { read, send } from '#src/http/api.ts';
import { queryClient } from '#src/http/query-client.ts';

/** Every estimate of a case and the verdict over its lines in force. */
export const estimatesOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'estimates'],
    queryFn: ({ signal }) => read(`/cases/${number}/estimates`, EstimatesView, signal),
  });

/** The verdicts over the lines of evidence of the cases of a page, by their numbers. */
export const verdictsOf = (numbers: readonly string[]) =>
  queryOptions({
    queryKey: ['casebook', 'verdicts', ...numbers],
    enabled: numbers.length > 0,
    queryFn: ({ signal }) => read(`/casebook/verdicts?numbers=${numbers.join(',')}`, CasebookVerdicts, signal),
  });

/** The lengths of a case that marks say now. */
export const measurementsOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'measurements'],
    queryFn: ({ signal }) => read(`/cases/${number}/measurements`, MeasurementList, signal),
  });

export const materialsQuery = queryOptions({
  queryKey: ['materials'],
  queryFn: ({ signal }) => read('/materials', MaterialList, signal),
});

/** A material with the constants an input may be taken from. */
export const constantsOf = (materialId: string) =>
  queryOptions({
    queryKey: ['materials', materialId],
    queryFn: ({ signal }) => read(`/materials/${materialId}`, MaterialWithConstants, signal),
  });

/** The acts on estimates of one case. What each answers is read again with the whole case. */
export function useEstimateActs(number: string) {
  const path = `/cases/${number}/estimates`;
  const onSuccess = () => queryClient.invalidateQueries({ queryKey: ['case', number] });
  const make = useMutation({
    mutationFn: (wanted: EstimateWantedInput) => send('POST', path, wanted, EstimateView),
    onSuccess,
  });
  const renew = useMutation({
    mutationFn: (id: string) => send('POST', `${path}/${id}/renewed`, {}, EstimateView),
    onSuccess,
  });
  const keepOld = useMutation({
    mutationFn: ({ id, reason }: { id: string; reason: string }) =>
      send('POST', `${path}/${id}/kept`, { reason }, EstimateView),
    onSuccess,
  });
  const stand = useMutation({
    mutationFn: ({ id, ...body }: { id: string; standing: 'in use' | 'set aside'; reason: string }) =>
      send('POST', `${path}/${id}/standing`, body, EstimateView),
    onSuccess,
  });
  return { make, renew, keepOld, stand };
}
