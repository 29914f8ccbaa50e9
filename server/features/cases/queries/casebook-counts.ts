import { sql } from 'drizzle-orm';
import type { Person } from '#shared/contracts/people.ts';
import type { Reader } from '../../../database/connection.ts';
import { isStale, readingOf, waitsForSignatureOf, wallOf } from './casebook-filter.ts';

export type CountsRead = {
  this_year: number;
  all: number;
  open: number;
  with_me: number;
  to_sign: number;
  stale: number;
  in_review: number;
  oldest_open_at: string | null;
};

const isOpen = sql`c.state in ('received', 'examining', 'drafting', 'in review')`;

/** The counts over the table, for the cases this person sees. What tells of the work inside counts for staff alone. */
export async function countForTabs(reader: Reader, person: Person, thisYear: number): Promise<CountsRead> {
  const isStaff = readingOf(person) === 'laboratory';
  const staffOnly = (condition: ReturnType<typeof waitsForSignatureOf>) => (isStaff ? condition : sql`false`);
  const { rows } = await reader.db.execute<CountsRead>(sql`
    select
      count(*) filter (where c.received_at >= ${`${thisYear}-01-01T00:00:00Z`}::timestamptz)::int as this_year,
      count(*)::int as all,
      count(*) filter (where ${isOpen})::int as open,
      count(*) filter (where ${staffOnly(sql`${isOpen} and c.assigned_to = ${person.id}::uuid`)})::int as with_me,
      count(*) filter (where ${staffOnly(waitsForSignatureOf(person))})::int as to_sign,
      count(*) filter (where ${staffOnly(isStale)})::int as stale,
      count(*) filter (where ${staffOnly(sql`c.state = 'in review'`)})::int as in_review,
      min(c.received_at) filter (where ${isOpen}) as oldest_open_at
    from cases c where ${wallOf(person)}`);
  return rows[0];
}
