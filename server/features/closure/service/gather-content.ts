import {
  contentHashOf,
  sealPart,
  type SealedFile,
  type SealedPart,
  type SealedTable,
} from '../../../sealing/manifest.ts';
import { hashOfContent } from '../../../sealing/canonical-hash.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { HeldCase } from '../queries/closures.ts';
import { gatherRows, rowId, type GatheredRow, type GatheredTable } from '../queries/gather-rows.ts';
import { contentParts, trailPart, type PartRow } from './part-table.ts';

/** Everything of the case that a signature vouches for, part by part, with the hash that a signature carries. */
export async function gatherContent(
  tx: Transaction,
  heldCase: HeldCase,
): Promise<{ parts: SealedPart[]; contentHash: string }> {
  const parts: SealedPart[] = [];
  for (const part of contentParts) parts.push(await gatherPart(tx, heldCase, part));
  return { parts, contentHash: contentHashOf(heldCase.number, parts) };
}

/** Who did what, up to this moment of the transaction. */
export function gatherTrail(tx: Transaction, heldCase: HeldCase): Promise<SealedPart> {
  return gatherPart(tx, heldCase, trailPart);
}

/** The rows of one table as they stand, each with the hash of the given columns; without any given, of all it has. */
export async function gatherTable(
  tx: Transaction,
  heldCase: HeldCase,
  { table, columns }: { table: GatheredTable; columns?: readonly string[] },
): Promise<SealedTable> {
  return sealedTable(table, await gatherRows(tx, table, heldCase.id), columns);
}

async function gatherPart(tx: Transaction, heldCase: HeldCase, part: PartRow): Promise<SealedPart> {
  const rows: Record<string, GatheredRow[]> = {};
  for (const table of part.tables) rows[table] = await gatherRows(tx, table, heldCase.id);
  return sealPart({
    ...{ key: part.key, chapter: part.chapter, name: part.name },
    holding: part.holding(rows),
    tables: part.tables.map((table) => sealedTable(table, rows[table])),
    files: (rows.fractographs ?? []).filter((row) => row.state === 'ready').map(fileOf),
  });
}

function sealedTable(table: GatheredTable, rows: readonly GatheredRow[], columns?: readonly string[]): SealedTable {
  const named = columns ?? Object.keys(rows.at(0) ?? {}).sort();
  return {
    table,
    columns: [...named],
    rows: rows.map((row) => ({
      id: rowId(row),
      hash: hashOfContent(Object.fromEntries(named.map((column) => [column, row[column] ?? null]))),
    })),
  };
}

function fileOf(row: GatheredRow): SealedFile {
  return {
    sha256: String(row.sha256),
    bytes: Number(row.bytes),
    words: `Fig. ${String(row.figure_number)}, ${String(row.file_name)}`,
  };
}
