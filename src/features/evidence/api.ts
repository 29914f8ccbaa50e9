import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { EvidenceView } from '#shared/contracts/evidence.ts';
import { FractographList } from '#shared/contracts/fractographs.ts';
import { MaterialList } from '#shared/contracts/materials.ts';
import { read, send, type Method } from '#src/http/api.ts';

/** All of the chapter: parts, pieces and mating faces of a case. */
export const evidenceOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'evidence'],
    queryFn: ({ signal }) => read(`/cases/${number}/evidence`, EvidenceView, signal),
  });

/** The fractographs of a case, to be shown beside the faces they were taken of. */
export const facesTakenOf = (number: string) =>
  queryOptions({
    queryKey: ['case', number, 'evidence', 'faces taken'],
    queryFn: ({ signal }) => read(`/cases/${number}/fractographs`, FractographList, signal),
  });

/** The materials a part may be of. */
export const materialsOffered = queryOptions({
  queryKey: ['materials', 'offered'],
  queryFn: ({ signal }) => read('/materials', MaterialList, signal),
});

export type EvidenceAct = {
  readonly method: Method;
  /** Below the evidence of the case: "/pieces". */
  readonly path: string;
  readonly body: unknown;
  /** What the server answers. */
  readonly schema: z.ZodType;
};

/** Sends one act on the pieces of a case and reads the chapter again, whether it was done or refused. */
export function useEvidenceAct(number: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ method, path, body, schema }: EvidenceAct) =>
      send(method, `/cases/${number}/evidence${path}`, body, schema),
    onSettled: () => client.invalidateQueries({ queryKey: evidenceOf(number).queryKey }),
  });
}

/** Names the material of the case. */
export function useCaseMaterial(number: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (named: { materialId: string; versionSeen: number }) =>
      send('PATCH', `/cases/${number}`, named, z.unknown()),
    onSettled: () => client.invalidateQueries({ queryKey: ['case', number] }),
  });
}
