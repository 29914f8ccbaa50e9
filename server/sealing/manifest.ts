import { z } from 'zod';
import { hashOfContent } from './canonical-hash.ts';

/** Rows of one table that a seal covers: each by its id and the hash of the named columns. */
export const SealedTable = z.object({
  table: z.string(),
  /** The columns as they were at the sealing, so that a column added later changes no seal. */
  columns: z.array(z.string()),
  rows: z.array(z.object({ id: z.string(), hash: z.string() })),
});
export type SealedTable = z.infer<typeof SealedTable>;

export const SealedFile = z.object({ sha256: z.string(), bytes: z.number(), words: z.string() });
export type SealedFile = z.infer<typeof SealedFile>;

export const SealedPart = z.object({
  key: z.string(),
  /** The chapter it stands under, i to vii; empty where it goes with the part above. */
  chapter: z.string(),
  name: z.string(),
  /** What it holds, in words: "5 images, 1.9 GB". */
  holding: z.string(),
  tables: z.array(SealedTable),
  files: z.array(SealedFile),
  hash: z.string(),
});
export type SealedPart = z.infer<typeof SealedPart>;

/** Everything a closure froze, as it is stored and printed. */
export const Manifest = z.object({
  format: z.literal(1),
  number: z.string(),
  closedAt: z.string(),
  parts: z.array(SealedPart),
  previousRootHash: z.string(),
});
export type Manifest = z.infer<typeof Manifest>;

export type UnhashedPart = Omit<SealedPart, 'hash'>;

/** The part with its fingerprint: the hash of the list of its rows and files, whatever is said of it in words. */
export function sealPart(part: UnhashedPart): SealedPart {
  return { ...part, hash: hashOfContent({ key: part.key, tables: part.tables, files: part.files }) };
}

/** The hash over the list of parts; chained to the laboratory's previous closure, so that none can be taken out. */
export function rootHashOf({ parts, ...rest }: Manifest): string {
  return hashOfContent({ ...rest, parts: parts.map(({ key, hash }) => ({ key, hash })) });
}

/** What a signature vouches for: the case's content, without who signed it or did what. */
export function contentHashOf(number: string, parts: readonly SealedPart[]): string {
  return hashOfContent({ number, parts: parts.map(({ key, hash }) => ({ key, hash })) });
}

export type Deviation = { readonly words: string; readonly outcome: 'changed' | 'missing' | 'added' };

/** Where what stands now differs from a sealed part: row by row, and by what the part's own hash says of its list. */
export function compareWithPart(sealed: SealedPart, tablesNow: readonly SealedTable[]): Deviation[] {
  const listIsWhole = sealPart(sealed).hash === sealed.hash;
  return [
    ...(listIsWhole ? [] : [{ words: 'the list itself', outcome: 'changed' as const }]),
    ...sealed.tables.flatMap((table) =>
      compareTable(
        table,
        tablesNow.find((now) => now.table === table.table),
      ),
    ),
  ];
}

function compareTable(sealed: SealedTable, now: SealedTable | undefined): Deviation[] {
  const hashNow = new Map(now?.rows.map((row) => [row.id, row.hash]));
  const listed = new Set(sealed.rows.map((row) => row.id));
  const words = (id: string) => `${sealed.table.replaceAll('_', ' ')} ${id}`;
  return [
    ...sealed.rows.flatMap(({ id, hash }): Deviation[] => {
      const found = hashNow.get(id);
      if (found === hash) return [];
      return [{ words: words(id), outcome: found === undefined ? 'missing' : 'changed' }];
    }),
    ...[...hashNow.keys()]
      .filter((id) => !listed.has(id))
      .map((id) => ({ words: words(id), outcome: 'added' as const })),
  ];
}
