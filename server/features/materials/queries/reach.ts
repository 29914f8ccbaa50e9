import { sql } from 'drizzle-orm';
import type { Person } from '#shared/contracts/people.ts';
import type { CaseState } from '#shared/vocabulary/case-states.ts';
import type { Reader } from '../../../database/connection.ts';

export type CaseReached = { number: string; state: CaseState; estimates: number; seen: boolean };

/** The cases that estimates and bound values belong to, each with whether this person of the laboratory sees it. */
export async function listCasesReached(reader: Reader, person: Person, recordIds: readonly string[]) {
  const { rows } = await reader.db.execute<CaseReached>(sql`
    with reached as (
      select case_id, 1 as estimate from estimates where id = any(${sql.param(recordIds)}::uuid[])
      union all
      select case_id, 0 from bound_values where id = any(${sql.param(recordIds)}::uuid[]))
    select c.number, c.state, sum(r.estimate)::int as estimates,
      (not c.restricted or exists (
        select 1 from case_people p where p.case_id = c.id and p.person_id = ${person.id}::uuid)) as seen
    from reached r join cases c on c.id = r.case_id
    group by c.id, c.number, c.state, c.restricted order by c.received_at, c.id`);
  return [...rows];
}
