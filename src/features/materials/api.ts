import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import {
  ConstantReach,
  ConstantView,
  MaterialList,
  MaterialView,
  MaterialWithConstants,
  type ConstantTyped,
  type MaterialEntered,
} from '#shared/contracts/materials.ts';
import { read, send } from '#src/http/api.ts';

export const materialsQuery = queryOptions({
  queryKey: ['materials', 'list'],
  queryFn: ({ signal }) => read('/materials', MaterialList, signal),
});

export const materialOf = (id: string) =>
  queryOptions({
    queryKey: ['materials', id],
    queryFn: ({ signal }) => read(`/materials/${encodeURIComponent(id)}`, MaterialWithConstants, signal),
  });

/** What hangs on a record of a constant; for the engineers who record them. */
export const reachOf = (materialId: string, constantId: string) =>
  queryOptions({
    queryKey: ['materials', materialId, 'reach', constantId],
    queryFn: ({ signal }) => read(`/materials/${materialId}/constants/${constantId}/reach`, ConstantReach, signal),
  });

export function useEnterMaterial() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (entered: MaterialEntered) => send('POST', '/materials', entered, MaterialView),
    onSettled: () => client.invalidateQueries({ queryKey: ['materials'] }),
  });
}

const Recorded = z.object({ constant: ConstantView, staleCount: z.number().int() });

export function useRecordConstant(materialId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (typed: ConstantTyped) => send('POST', `/materials/${materialId}/constants`, typed, Recorded),
    onSettled: () => client.invalidateQueries({ queryKey: ['materials'] }),
  });
}
