import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { allRoutes } from '#server/all-routes.ts';
import { sealedTables } from '#server/database/sealed-tables.ts';
import { acceptNotes, sign } from '../support/a-closed-case.ts';
import { aDraftedCase, type DraftedCase } from '../support/a-drafted-case.ts';
import { openedCase } from '../support/cases-at-hand.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let database: pg.Client;
let closed: DraftedCase & { ids: Record<string, string> };

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
  database = new pg.Client({ connectionString: server.databaseUrl });
  await database.connect();
  closed = await aFullClosedCase();
});
afterAll(async () => {
  await database.end();
  await server.stop();
});

/** A case with a row in every table that a seal rests on, closed at the routes. */
async function aFullClosedCase() {
  const drafted = await aDraftedCase(people);
  const { client, person } = people.analyst;
  const partId = (await client.get(`${drafted.at}/evidence`)).body.parts[0].id;
  const piece = { partId, parentId: null, way: 'break', mass: null, place: 'safe', holder: 'Ana', condition: null };
  const pieceIds: string[] = [];
  for (const description of ['head', 'foot']) {
    const answer = await client.post(`${drafted.at}/evidence/pieces`, { ...piece, description, receivedOn: null });
    pieceIds.push(String(answer.body.id));
  }
  const [one, other] = pieceIds.map((fragmentId) => ({ fragmentId, face: 'A' }));
  await client.post(`${drafted.at}/evidence/mates`, { one, other, crack: null });
  const statement = {
    statement: 'It was lowered by hand.',
    standing: 'told',
    source: 'the crew',
    givenOn: '2026-06-01',
  };
  await client.post(`${drafted.at}/background`, statement);
  const { estimates } = (await client.get(`${drafted.at}/estimates`)).body;
  const standing = { standing: 'set aside', reason: 'The gauge slipped.' };
  await client.post(`${drafted.at}/estimates/${estimates[1].id}/standing`, standing);
  await database.query(
    `insert into figures (id, case_id, fractograph_id, mark_ids, caption, made_by, made_at)
     values (gen_random_uuid(), $1, $2, array[$3::uuid], 'The origin', $4, now())`,
    [drafted.id, drafted.imageId, drafted.marks.origin, person.id],
  );
  await database.query(
    `insert into bound_values (id, case_id, source_kind, source_id, quantity, format, made_by, made_at)
     values (gen_random_uuid(), $1, 'estimate', $2, 'stress at the origin',
       '{"interval": true, "decimals": null, "significant": null}', $3, now())`,
    [drafted.id, estimates[0].id, person.id],
  );
  await client.post(`${drafted.at}/review/send`);
  await acceptNotes(people.manager, drafted.at);
  await sign(people.analyst, drafted.at, 'authored');
  const { status, body } = await sign(people.manager, drafted.at, 'approved');
  if (status !== 201) throw new Error(`not closed: ${JSON.stringify(body)}`);
  const ids = {
    partId,
    pieceId: pieceIds[0],
    fractographId: drafted.imageId,
    markId: drafted.marks.mirror,
    estimateId: String(estimates[0].id),
  };
  return { ...drafted, ids };
}

const caseColumn = (table: string) => (table === 'cases' ? 'id' : 'case_id');

/** The code the database refuses a statement with; nothing is left behind, whatever it says. */
async function refusalOf(statement: string, values: unknown[]): Promise<string> {
  await database.query('begin');
  try {
    const { rowCount } = await database.query(statement, values);
    return `done to ${rowCount ?? 0}`;
  } catch (error) {
    return error instanceof pg.DatabaseError ? (error.code ?? '') : String(error);
  } finally {
    await database.query('rollback');
  }
}

// HB001: the case is closed. HB002: a record is never changed, closed case or not.
const refused = ['HB001', 'HB002'];

describe.each(sealedTables)('under a closed case, the table %s', (table) => {
  const own = caseColumn(table);

  it('holds something to defend', async () => {
    const { rows } = await database.query(`select 1 from ${table} where ${own} = $1`, [closed.id]);
    expect(rows.length).toBeGreaterThan(0);
  });

  it.runIf(table !== 'cases')('takes no new row', async () => {
    expect(await refusalOf(`insert into ${table} (case_id) values ($1)`, [closed.id])).toBe('HB001');
  });

  it('takes no change', async () => {
    const change = table === 'cases' ? `title = 'another'` : 'case_id = case_id';
    expect(refused).toContain(await refusalOf(`update ${table} set ${change} where ${own} = $1`, [closed.id]));
  });

  it('gives no row up', async () => {
    expect(refused).toContain(await refusalOf(`delete from ${table} where ${own} = $1`, [closed.id]));
  });

  it.runIf(table !== 'cases')('lets no row be moved out of the case', async () => {
    const { id } = await openedCase(people);
    const moving = `update ${table} set case_id = $2 where case_id = $1`;
    expect(refused).toContain(await refusalOf(moving, [closed.id, id]));
  });
});

/** How many rows every sealed table holds, and a hash of all of them. */
async function everythingSealed(): Promise<unknown> {
  const found: Record<string, unknown> = {};
  for (const table of sealedTables) {
    const { rows } = await database.query(
      `select count(*)::int as rows, md5(string_agg(t::text, '|' order by t::text)) as hash from ${table} t`,
    );
    found[table] = rows[0];
  }
  return found;
}

const changing = allRoutes.filter((route) => route.rule.who === 'may in case' && route.method !== 'get');
const expected = ['closed-case', 'wrong-state', 'not-allowed', 'not-valid', 'not-found'];

describe('every route that changes a case', () => {
  it('is known to this test', () => {
    expect(changing.length).toBeGreaterThan(25);
  });

  it.each(changing.map((route) => ({ method: route.method, path: route.path })))(
    'refuses a closed case and changes nothing: $method $path',
    async ({ method, path }) => {
      const before = await everythingSealed();
      const url = path.replace(/:(\w+)/g, (_all, name: string) =>
        name === 'number' ? closed.number : (closed.ids[name] ?? randomUUID()),
      );
      for (const { client } of [people.analyst, people.manager, people.engineer]) {
        const { status, body } = await client.ask(method.toUpperCase(), url, {});
        expect({ status, code: expected.includes(body.code) ? 'refused' : body.code }).toEqual({
          status,
          code: 'refused',
        });
      }
      expect(await everythingSealed()).toEqual(before);
    },
  );

  it('says to an analyst that the case is closed and that nothing was changed', async () => {
    const note = { kind: 'note', geometry: { shape: 'point', at: { x: 1, y: 1 } }, certainty: 'likely', note: '' };
    const mark = { ...note, boundary: null, originCode: null };
    const marks = `${closed.at}/fractographs/${closed.imageId}/marks`;
    const { status, body } = await people.analyst.client.post(marks, mark);
    expect({ status, code: body.code, stillHolds: body.stillHolds }).toEqual({
      ...{ status: 409, code: 'closed-case' },
      stillHolds: 'Nothing in the case was changed.',
    });
  });
});
