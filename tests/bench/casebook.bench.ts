import { PgDialect } from 'drizzle-orm/pg-core';
import { sql } from 'drizzle-orm';
import { connectDatabase, type Database } from '#server/database/connection.ts';
import { admitPerson, enterOrganisation } from '#server/features/people/service/admit-person.ts';
import { findOpenPerson } from '#server/features/people/service/find-settings.ts';
import { casebookPage, casebookTotal } from '#server/features/cases/queries/casebook.ts';
import { listCasebook } from '#server/features/cases/service/list-casebook.ts';
import { contextFor, visitorContext, type Context } from '#server/http/context.ts';
import { localFolderStorage } from '#server/storage/local-folder.ts';
import { CasebookQuery } from '#shared/contracts/casebook.ts';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { freshDatabase } from '../support/database.ts';

export const name = 'A page of the Casebook out of 100 000 cases, over the same SQL sent through pg alone';

const caseCount = 100_000;
const rounds = 15;

const asked: readonly { words: string; query: Record<string, string> }[] = [
  { words: 'newest first', query: {} },
  { words: 'page 2 000', query: { page: '2000' } },
  { words: 'by title', query: { order: 'title', direction: 'ascending' } },
  { words: 'two words', query: { words: 'ring 421' } },
  { words: 'in review, with me', query: { state: 'in review', held: 'me' } },
];

/** Measures both in turn, so that what else the machine does falls on both alike; medians. */
export async function run({ pgUrl }: { pgUrl: string }): Promise<string[]> {
  const fresh = await freshDatabase(pgUrl);
  const uploads = await mkdtemp(join(tmpdir(), 'hacklebook-bench-'));
  const database = connectDatabase(fresh.url, 4);
  try {
    const context = await anAnalyst(database, uploads);
    await makeCases(database, context);
    const lines = [];
    for (const { words, query } of asked) lines.push(await measure(database, context, { words, query }));
    return lines;
  } finally {
    await database.pool.end();
    await fresh.drop();
    await rm(uploads, { recursive: true, force: true });
  }
}

async function measure(database: Database, context: Context, { words, query }: (typeof asked)[number]) {
  const wanted = CasebookQuery.parse({ year: 'any', ...query });
  const asOf = { person: context.person, query: wanted, thisYear: 2026 };
  const dialect = new PgDialect({ casing: 'snake_case' });
  const [page, total] = [casebookPage(asOf), casebookTotal(asOf)].map((each) => dialect.sqlToQuery(each));
  const alone = () => Promise.all([page, total].map(({ sql: text, params }) => database.pool.query(text, params)));
  const [service, plain]: [number[], number[]] = [[], []];
  for (let round = 0; round < rounds; round += 1) {
    service.push(await timed(() => listCasebook(context, wanted)));
    plain.push(await timed(alone));
  }
  const [ours, bare] = [median(service), median(plain)];
  return `${words}: ${ours.toFixed(1)} ms, ${bare.toFixed(1)} ms through pg alone, ratio ${(ours / bare).toFixed(2)}`;
}

async function timed(work: () => Promise<unknown>): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

function median(values: readonly number[]): number {
  return values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
}

async function anAnalyst(database: Database, uploads: string): Promise<Context> {
  const limits = { largestFileBytes: 1, largestImagePx: 1 };
  const parts = { database, storage: await localFolderStorage(uploads), limits, zone: 'UTC' };
  const visitor = visitorContext(parts);
  const { id: organisationId } = await enterOrganisation(visitor, { name: 'Bench Laboratory', kind: 'laboratory' });
  const entry = { name: 'Ana Lyst', mail: 'ana@bench.example', organisationId, roles: ['analyst'] as const };
  const { id } = await admitPerson(visitor, { ...entry, password: 'only measured with' });
  const person = await findOpenPerson(visitor, id);
  if (!person) throw new Error('the analyst of the measurement has no account');
  return contextFor(person, parts);
}

/** Cases over ten years, one in fifty restricted, one in ten held by the analyst. */
async function makeCases(database: Database, { person }: Context): Promise<void> {
  await database.db.execute(sql`
    insert into cases (id, number, title, summary, kind, state, urgency, organisation_id, assigned_to, restricted,
      received_at, state_since)
    select gen_random_uuid(), 'HB-' || 2017 + i / 10000 || '-' || lpad((i % 10000 + 1)::text, 5, '0'),
      (array['Seal ring', 'Bend bar', 'Sight glass', 'Post insulator', 'Crown'])[1 + i % 5] || ' ' || i,
      'broke in service', 'service part', (array['received', 'examining', 'drafting', 'in review'])[1 + i % 4], 'routine',
      ${person.organisationId}::uuid, case when i % 10 = 0 then ${person.id}::uuid end, i % 50 = 0,
      timestamptz '2017-01-01' + i * interval '50 minutes', timestamptz '2017-01-01' + i * interval '50 minutes'
    from generate_series(0, ${caseCount - 1}::int) i`);
  await database.db.execute(sql`analyze cases`);
}
