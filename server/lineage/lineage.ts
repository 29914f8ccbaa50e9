import { sql } from 'drizzle-orm';
import type { LineageKind } from '#shared/vocabulary/lineage-kinds.ts';
import type { Reader, Transaction } from '../database/connection.ts';
import { lineage } from '../database/tables/acts.ts';

export type RecordRef = { readonly kind: LineageKind; readonly id: string };

/** Says, in the transaction that makes `made`, which records it was made from. */
export async function recordLineage(tx: Transaction, made: RecordRef, from: readonly RecordRef[]): Promise<void> {
  if (from.length === 0) return;
  await tx.db
    .insert(lineage)
    .values(from.map((source) => ({ fromKind: source.kind, fromId: source.id, toKind: made.kind, toId: made.id })))
    .onConflictDoNothing();
}

export type Supersession = {
  readonly kind: LineageKind;
  /** The record that holds no longer. */
  readonly oldId: string;
  /** What takes its place; absent when it is withdrawn or removed. */
  readonly newId?: string;
  /** For the margin: "mark m3 was moved by Ilse Varga". */
  readonly why: string;
};

/**
 * Marks everything downstream of a superseded record stale, across cases, in one statement of the same transaction.
 * What is sealed isn't touched: staleness stands in a table of its own.
 * @returns the records newly stale, with the case each belongs to.
 */
export async function markDependentsStale(tx: Transaction, cause: Supersession): Promise<RecordRef[]> {
  const { rows } = await tx.db.execute<{ record_kind: LineageKind; record_id: string }>(sql`
    with recursive downstream (kind, id) as (
      select to_kind, to_id from lineage where from_id = ${cause.oldId}::uuid and from_kind = ${cause.kind}
      union
      select l.to_kind, l.to_id from lineage l join downstream d on l.from_id = d.id and l.from_kind = d.kind
    )
    insert into staleness (record_kind, record_id, cause_kind, cause_id, replaced_by_id, case_id, why, since)
    select d.kind, d.id, ${cause.kind}, ${cause.oldId}::uuid, ${cause.newId ?? null}::uuid,
      coalesce(
        (select case_id from calibration_bindings where id = d.id), (select case_id from measurements where id = d.id),
        (select case_id from estimates where id = d.id), (select case_id from bound_values where id = d.id),
        (select case_id from figures where id = d.id)),
      ${cause.why}, ${tx.at.toISOString()}::timestamptz
    from downstream d
    where d.id is distinct from ${cause.newId ?? null}::uuid
    on conflict (record_id, cause_id) do nothing
    returning record_kind, record_id`);
  return rows.map((row) => ({ kind: row.record_kind, id: row.record_id }));
}

/** What a record was made from, all the way up; nearest first. */
export async function listSources(reader: Reader, record: RecordRef): Promise<(RecordRef & { depth: number })[]> {
  const { rows } = await reader.db.execute<{ kind: LineageKind; id: string; depth: number }>(sql`
    with recursive upstream (kind, id, depth) as (
      select from_kind, from_id, 1 from lineage where to_id = ${record.id}::uuid and to_kind = ${record.kind}
      union
      select l.from_kind, l.from_id, u.depth + 1 from lineage l join upstream u on l.to_id = u.id and l.to_kind = u.kind
    )
    select kind, id, min(depth)::int as depth from upstream group by kind, id order by depth`);
  return [...rows];
}

/** What hangs on a record, all the way down; nearest first. */
export async function listDependents(reader: Reader, record: RecordRef): Promise<(RecordRef & { depth: number })[]> {
  const { rows } = await reader.db.execute<{ kind: LineageKind; id: string; depth: number }>(sql`
    with recursive downstream (kind, id, depth) as (
      select to_kind, to_id, 1 from lineage where from_id = ${record.id}::uuid and from_kind = ${record.kind}
      union
      select l.to_kind, l.to_id, d.depth + 1 from lineage l join downstream d on l.from_id = d.id and l.from_kind = d.kind
    )
    select kind, id, min(depth)::int as depth from downstream group by kind, id order by depth`);
  return [...rows];
}
