import { sql, type SQL } from 'drizzle-orm';
import type { Person } from '#shared/contracts/people.ts';
import type { CasebookQuery } from '#shared/contracts/casebook.ts';
import type { Role } from '#shared/vocabulary/roles.ts';
import { wordsQuery } from './words-query.ts';

/** As whom a person reads the Casebook: what they may know of a case follows from it. */
export type Reading = 'laboratory' | 'requester' | 'administrator' | 'nothing';

const caseReaders = ['analyst', 'manager', 'engineer'] as const satisfies readonly Role[];
const followers = ['requester', 'engineer'] as const satisfies readonly Role[];

export function readingOf(person: Person): Reading {
  const holds = (roles: readonly Role[]) => roles.some((role) => person.roles.includes(role));
  if (person.organisationKind !== 'laboratory') return holds(followers) ? 'requester' : 'nothing';
  if (holds(caseReaders)) return 'laboratory';
  return holds(['administrator']) ? 'administrator' : 'nothing';
}

/**
 * The wall as a condition on `cases c`: the same cases as `seesCase` in shared/rules/may.ts, which a test compares it
 * with; an administrator has every number and state, and nothing else.
 */
export function wallOf(person: Person): SQL {
  switch (readingOf(person)) {
    case 'laboratory':
      return sql`(not c.restricted or c.id in (
        select p.case_id from case_people p where p.person_id = ${person.id}::uuid))`;
    case 'requester':
      return sql`c.organisation_id = ${person.organisationId}::uuid`;
    case 'administrator':
      return sql`true`;
    case 'nothing':
      return sql`false`;
  }
}

/** Open staleness of any record of the case. */
export const isStale = sql`c.id in (select s.case_id from staleness s where s.settled_at is null)`;

/** A case in review that waits for this person: for their authorship, for a check, or for an approval. */
export function waitsForSignatureOf(person: Person): SQL {
  // Sets looked up once, not once a case: over many cases the difference is that of seconds.
  const signedUnder = (condition: SQL) => sql`c.id in (select g.case_id from signatures g
      join reviews r on r.id = g.review_id where r.outcome is null and ${condition})`;
  const signed = (meaning: string) => signedUnder(sql`g.meaning = ${meaning}`);
  const signedByMe = signedUnder(sql`g.person_id = ${person.id}::uuid`);
  const wrote = sql`c.id in (select a.case_id from case_authors a where a.person_id = ${person.id}::uuid)`;
  const asAnalyst = person.roles.includes('analyst')
    ? sql`(${wrote} and not ${signedByMe}) or (not ${wrote} and not ${signed('checked')})`
    : sql`false`;
  const asManager = person.roles.includes('manager') ? sql`not ${wrote} and not ${signed('approved')}` : sql`false`;
  return sql`(c.state = 'in review' and c.hold_reason is null and (${asAnalyst} or (${asManager})))`;
}

/** Every condition of a query of the Casebook. What a person may not know of a case they cannot ask for either. */
export function filterOf(person: Person, query: CasebookQuery, thisYear: number): SQL {
  const reading = readingOf(person);
  const conditions = [wallOf(person), stateFilter(query.state, reading), yearFilter(query.year, thisYear)];
  if (query.words !== '') conditions.push(wordsFilter(query.words, reading));
  if (reading === 'laboratory') {
    conditions.push(heldFilter(person, query.held));
    if (query.material !== 'any') conditions.push(sql`c.material_id = ${query.material}::uuid`);
    if (query.origin !== 'any') conditions.push(sql`${originCodeOf} = ${query.origin}`);
    if (query.stale) conditions.push(isStale);
    if (query.sign) conditions.push(waitsForSignatureOf(person));
  }
  return sql.join(conditions, sql` and `);
}

/** The code of the newest origin mark still standing. */
const originCodeOf = sql`(select v.origin_code from marks m join lateral (
    select w.origin_code, w.removed, w.made_at, w.id from mark_versions w where w.mark_id = m.id
    order by w.version desc limit 1) v on true
  where m.case_id = c.id and m.kind = 'origin' and not v.removed
  order by v.made_at desc, v.id desc limit 1)`;

/** Who follows a case finds it by number and title alone, so that a hit tells nothing of what stands inside. */
function wordsFilter(words: string, reading: Reading): SQL {
  const wanted = sql`to_tsquery('simple', ${wordsQuery(words)})`;
  if (reading === 'laboratory') return sql`c.search @@ ${wanted}`;
  const known = reading === 'requester' ? sql`c.number || ' ' || c.title` : sql`c.number`;
  return sql`to_tsvector('simple', ${known}) @@ ${wanted}`;
}

function stateFilter(state: CasebookQuery['state'], reading: Reading): SQL {
  if (state === 'any' || (state === 'on hold' && reading === 'requester')) return sql`true`;
  if (state === 'open') return sql`c.state in ('received', 'examining', 'drafting', 'in review')`;
  if (state === 'on hold') return sql`c.hold_reason is not null and c.state <> 'withdrawn'`;
  return sql`c.state = ${state}`;
}

function yearFilter(year: CasebookQuery['year'], thisYear: number): SQL {
  if (year === 'any') return sql`true`;
  const wanted = year === 'this' ? thisYear : year;
  return sql`c.received_at >= ${`${wanted}-01-01T00:00:00Z`}::timestamptz
    and c.received_at < ${`${wanted + 1}-01-01T00:00:00Z`}::timestamptz`;
}

function heldFilter(person: Person, held: CasebookQuery['held']): SQL {
  if (held === 'anyone') return sql`true`;
  if (held === 'no one') return sql`c.assigned_to is null`;
  return sql`c.assigned_to = ${held === 'me' ? person.id : held}::uuid`;
}
