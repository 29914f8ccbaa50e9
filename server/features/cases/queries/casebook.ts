import { sql, type SQL } from 'drizzle-orm';
import type { CasebookOrder, CasebookQuery, StaffRow } from '#shared/contracts/casebook.ts';
import type { LineageKind } from '#shared/vocabulary/lineage-kinds.ts';
import type { Person } from '#shared/contracts/people.ts';
import type { Reader } from '../../../database/connection.ts';
import { filterOf } from './casebook-filter.ts';

/** A row as the database gives it; instants as text. */
export type CasebookRowRead = {
  number: string;
  title: string;
  state: StaffRow['state'];
  urgency: StaffRow['urgency'];
  hold_until: string | null;
  received_at: string;
  state_since: string;
  closed_at: string | null;
  material: string | null;
  assigned_to: string | null;
  assigned_name: string | null;
  has_fractographs: boolean;
  origin_code: StaffRow['originCode'];
  picture_fractograph_id: string | null;
  picture_x: number | null;
  picture_y: number | null;
  picture_across: number | null;
  stale_cause: LineageKind | null;
  stale_why: string | null;
  stale_since: string | null;
};

type Asked = { person: Person; query: CasebookQuery; thisYear: number };

// Years have four digits and are followed by the place in the year, which may outgrow four.
const numberOrder = sql`(substr(c.number, 4, 4) || lpad(substr(c.number, 9), 8, '0'))`;
// Of the image's width, so that the mirror about the origin is seen with it.
const shareShown = sql`0.35`;
const stateOrder = sql`array_position(
  array['received', 'examining', 'drafting', 'in review', 'closed', 'withdrawn'], c.state)`;

/**
 * One page of the Casebook. The page's cases are found first, on indexed columns of their own table; what stands beside
 * them is then looked up for those alone.
 */
export function casebookPage({ person, query, thisYear }: Asked): SQL {
  return sql`
    with page as (
      select c.id, row_number() over () as place from (
        select c.id from cases c where ${filterOf(person, query, thisYear)}
        order by ${orderOf(query)} limit ${query.size} offset ${(query.page - 1) * query.size}) c)
    select c.number, c.title, c.state, c.urgency, c.hold_until::text, c.received_at, c.state_since, c.closed_at,
      m.name as material, c.assigned_to, h.name as assigned_name,
      exists (select 1 from fractographs f where f.case_id = c.id) as has_fractographs,
      o.origin_code, o.picture_fractograph_id, o.picture_x, o.picture_y, o.picture_across,
      s.cause_kind as stale_cause, s.why as stale_why, s.since as stale_since
    from page join cases c on c.id = page.id
    left join materials m on m.id = c.material_id
    left join people h on h.id = c.assigned_to
    left join lateral (
      select v.origin_code,
        case when f.state = 'ready' then f.id end as picture_fractograph_id,
        (v.geometry -> 'at' ->> 'x')::float8 as picture_x, (v.geometry -> 'at' ->> 'y')::float8 as picture_y,
        round(f.width_px * ${shareShown})::int as picture_across
      from marks k join fractographs f on f.id = k.fractograph_id
      join lateral (
        select w.origin_code, w.geometry, w.removed, w.made_at, w.id from mark_versions w
        where w.mark_id = k.id order by w.version desc limit 1) v on true
      where k.case_id = c.id and k.kind = 'origin' and not v.removed
      order by v.made_at desc, v.id desc limit 1) o on true
    left join lateral (
      select t.cause_kind, t.why, t.since from staleness t where t.case_id = c.id and t.settled_at is null
      order by t.since desc limit 1) s on true
    order by page.place`;
}

export async function listCasebookPage(reader: Reader, asked: Asked): Promise<CasebookRowRead[]> {
  const { rows } = await reader.db.execute<CasebookRowRead>(casebookPage(asked));
  return [...rows];
}

/** How many cases the query finds, over all pages. */
export function casebookTotal({ person, query, thisYear }: Asked): SQL {
  return sql`select count(*)::int as total from cases c where ${filterOf(person, query, thisYear)}`;
}

export async function countCasebook(reader: Reader, asked: Asked): Promise<number> {
  const { rows } = await reader.db.execute<{ total: number }>(casebookTotal(asked));
  return rows[0].total;
}

/** The order of the rows; the words of `nulls` are those of the index, so that it can be used. */
function orderOf({ order, direction }: CasebookQuery): SQL {
  const isUp = direction === 'ascending';
  const way = isUp ? sql`asc nulls last` : sql`desc nulls first`;
  const columns: Record<CasebookOrder, SQL> = {
    number: sql`${numberOrder} ${way}`,
    // The oldest case is the one received first.
    age: isUp ? sql`c.received_at desc nulls last, c.id` : sql`c.received_at asc nulls first, c.id desc`,
    state: sql`${stateOrder} ${way}, c.received_at desc, c.id`,
    material: sql`(select name from materials where id = c.material_id) ${isUp ? sql`asc` : sql`desc`} nulls last, c.id`,
    title: sql`c.title ${way}, c.id ${isUp ? sql`asc` : sql`desc`}`,
  };
  return columns[order];
}
