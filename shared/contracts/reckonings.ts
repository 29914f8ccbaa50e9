import { z } from 'zod';
import { refusalCodes } from '../numeric/refusal-codes.ts';

const ListedNumber = z.number().nullable();

/** An input of a reckoning: a number, a word, or a list of numbers, with its unit ("code" for a word). */
export const ReckoningInput = z.object({
  value: z.union([ListedNumber, z.string().max(200), z.array(ListedNumber).max(10_000)]),
  unit: z.string().max(40),
});
export type ReckoningInput = z.infer<typeof ReckoningInput>;

/**
 * One method to be reckoned. The inputs have the names of the table of methods; an uncertainty stands beside its input as
 * u_load, uA or uStress. Whatever else stands in an entry is passed over.
 */
export const ReckoningWanted = z.object({
  id: z.string().max(80),
  method: z.string().max(80),
  inputs: z.record(z.string().max(60), ReckoningInput),
});
export type ReckoningWanted = z.infer<typeof ReckoningWanted>;

/** What is asked of the server at once. */
export const ReckoningsWanted = z.array(ReckoningWanted).min(1, 'List one method or more.').max(200);
export type ReckoningsWanted = z.infer<typeof ReckoningsWanted>;

const OutputValue = z.union([z.number(), z.string(), z.boolean(), z.array(z.union([z.number(), z.string()]))]);

export const Reckoning = z.union([
  z.object({
    id: z.string(),
    outputs: z.record(z.string(), z.object({ value: OutputValue, unit: z.string() })),
    cautions: z.array(z.object({ code: z.string(), weight: z.enum(['note', 'warning']), sentence: z.string() })),
  }),
  z.object({
    id: z.string(),
    refused: z.enum(refusalCodes),
    /** The input that is wrong, or the method. */
    field: z.string(),
  }),
]);
export type Reckoning = z.infer<typeof Reckoning>;
