import { z } from 'zod';

/** Who has a case open, and where in it: "fractographs/<id>", "findings". */
export const PersonHere = z.object({ id: z.uuid(), name: z.string(), place: z.string().max(120) });
export type PersonHere = z.infer<typeof PersonHere>;

/** What the socket of a case tells. A page fetches what changed; the news itself carries none of it. */
export const LiveNews = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('act'), act: z.string(), objectId: z.string().nullable(), by: z.string().nullable() }),
  z.object({ kind: z.literal('here'), people: z.array(PersonHere) }),
  /** News may have been missed: everything is to be fetched again. */
  z.object({ kind: z.literal('missed some') }),
]);
export type LiveNews = z.infer<typeof LiveNews>;

/** What a page tells: where in the case its person is now. */
export const LiveWord = z.object({ kind: z.literal('at'), place: z.string().max(120) });
export type LiveWord = z.infer<typeof LiveWord>;
