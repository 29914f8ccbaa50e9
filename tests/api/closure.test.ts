import { randomUUID } from 'node:crypto';
import { writeFile } from 'node:fs/promises';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readSealNumber } from '#server/sealing/seal-number.ts';
import { aConstant } from '../support/a-bar-case.ts';
import { acceptNotes, aCaseToApprove, aClosedCase, contentHashOf, sign } from '../support/a-closed-case.ts';
import { aDraftedCase } from '../support/a-drafted-case.ts';
import { openedCase } from '../support/cases-at-hand.ts';
import {
  admit,
  aLaboratory,
  startTestServer,
  testPassword,
  type Admitted,
  type TestServer,
} from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let deputy: Admitted;
let chief: Admitted;
let database: pg.Client;

beforeAll(async () => {
  server = await startTestServer({ environment: { HACKLEBOOK_ZONE: 'Europe/Zurich' } });
  people = await aLaboratory(server);
  const organisationId = people.laboratory.id;
  deputy = await admit(server, { name: 'Deputy Manager', organisationId, roles: ['manager'] });
  chief = await admit(server, { name: 'Chief Both', organisationId, roles: ['manager', 'administrator'] });
  database = new pg.Client({ connectionString: server.databaseUrl });
  await database.connect();
});
afterAll(async () => {
  await database.end();
  await server.stop();
});

const read = async (at: string, person = people.manager) => (await person.client.get(`${at}/review`)).body;
const stateOf = async (at: string) => (await people.manager.client.get(at)).body.state;

describe('the way to review', () => {
  it('names what stands in the way, and takes no case that is not ready', async () => {
    const { number } = await openedCase(people, { questions: [] });
    const at = `/cases/${number}`;
    for (const to of ['examining', 'drafting'])
      await people.analyst.client.post(`${at}/moves`, {
        to,
        versionSeen: (await people.analyst.client.get(at)).body.version,
      });
    const { readiness, acts } = await read(at, people.analyst);
    expect(readiness.filter((point: { kind: string }) => point.kind === 'blocker')).toMatchObject([
      { code: 'no-question' },
      { code: 'no-part' },
      { code: 'no-fractograph' },
      { code: 'findings-empty' },
    ]);
    expect(acts.send).toEqual({ allowed: false, reason: 'Opens once the 4 points above are settled.' });
    const { status, body } = await people.analyst.client.post(`${at}/review/send`);
    expect([status, body.code]).toEqual([409, 'not-ready']);
    expect(await stateOf(at)).toBe('drafting');
  });

  it('keeps a version of the findings and tells the managers no more than number, state and link', async () => {
    const { at, number } = await aDraftedCase(people);
    expect((await people.analyst.client.post(`${at}/review/send`)).status).toBe(201);
    expect(await stateOf(at)).toBe('in review');
    expect((await read(at)).rounds).toMatchObject([{ round: 1, findingsVersion: 1, outcome: null }]);
    const { rows } = await database.query(
      `select to_mail, subject, body from outgoing_mails where subject like $1 order by to_mail`,
      [`${number}%`],
    );
    expect(rows.map((row) => row.to_mail)).toEqual([chief.mail, deputy.mail, people.manager.mail].sort());
    for (const row of rows) expect(`${row.subject} ${row.body}`).not.toMatch(/porcelain|post|insulator/i);
  });

  it('is sent back with reasons only, and counts its rounds', async () => {
    const { at } = await aDraftedCase(people);
    await people.analyst.client.post(`${at}/review/send`);
    expect((await people.manager.client.post(`${at}/review/send-back`, { reasons: ' ' })).status).toBe(422);
    const reasons = 'Say how the mirror was read.';
    expect((await people.manager.client.post(`${at}/review/send-back`, { reasons })).status).toBe(204);
    expect(await stateOf(at)).toBe('drafting');
    await people.analyst.client.post(`${at}/review/send`);
    expect((await read(at)).rounds).toMatchObject([
      { round: 2, outcome: null },
      { round: 1, outcome: 'sent back', reasons },
    ]);
  });

  it('is open to an analyst alone, and sending back to a manager alone', async () => {
    const { at } = await aDraftedCase(people);
    expect((await people.manager.client.post(`${at}/review/send`)).status).toBe(403);
    expect((await people.outsider.client.post(`${at}/review/send`)).status).toBe(404);
    await people.analyst.client.post(`${at}/review/send`);
    const back = { reasons: 'no' };
    expect((await people.analyst.client.post(`${at}/review/send-back`, back)).status).toBe(403);
    expect((await people.requester.client.post(`${at}/review/send-back`, back)).status).toBe(403);
    expect((await people.outsider.client.post(`${at}/review/send-back`, back)).status).toBe(404);
  });
});

describe('a signature', () => {
  it('carries the name, the meaning, the zone and the fingerprint of what was read', async () => {
    const { at } = await aCaseToApprove(people);
    const { signatures, contentHash } = await read(at);
    expect(signatures).toMatchObject([
      { printedName: 'Ana Lyst', meaning: 'authored', zone: 'Europe/Zurich', contentHash, matches: true, round: 1 },
    ]);
  });

  it('is refused with a wrong password, which counts like a failed sign-in', async () => {
    const { at } = await aCaseToApprove(people);
    const contentHash = await contentHashOf(deputy, at);
    const wrong = { meaning: 'approved', password: 'not the password', contentHash };
    const answers: number[] = [];
    for (let tries = 0; tries < 6; tries += 1)
      answers.push((await deputy.client.post(`${at}/signatures`, wrong)).status);
    expect(answers).toEqual([422, 422, 422, 422, 422, 429]);
    expect((await sign(deputy, at, 'approved')).status).toBe(429);
    expect(await stateOf(at)).toBe('in review');
    const elsewhere = server.visitor();
    expect((await elsewhere.signIn(deputy.mail, testPassword)).status).toBe(429);
    await database.query('delete from sign_in_tries');
  });

  it('is refused on anything but what stands there now', async () => {
    const one = await aCaseToApprove(people);
    const other = await aCaseToApprove(people);
    const contentHash = await contentHashOf(people.manager, other.at);
    const { status, body } = await sign(people.manager, one.at, 'approved', { contentHash });
    expect([status, body.code]).toEqual([409, 'stale-version']);
    expect((await read(one.at)).signatures).toHaveLength(1);
  });

  it('is never an author’s as approved or checked, also by a crafted request', async () => {
    const both = await admit(server, {
      name: 'Analyst Manager',
      organisationId: people.laboratory.id,
      roles: ['analyst', 'manager'],
    });
    const drafted = await aDraftedCase(people);
    const note = { kind: 'note', geometry: { shape: 'point', at: { x: 5, y: 5 } }, certainty: 'likely' };
    const mark = { ...note, boundary: null, originCode: null, note: 'dust' };
    expect((await both.client.post(`${drafted.at}/fractographs/${drafted.imageId}/marks`, mark)).status).toBe(201);
    await people.analyst.client.post(`${drafted.at}/review/send`);
    await acceptNotes(people.manager, drafted.at);
    await sign(people.analyst, drafted.at, 'authored');
    for (const meaning of ['approved', 'checked']) {
      const { status, body } = await sign(both, drafted.at, meaning);
      expect([status, body.code]).toEqual([403, 'not-allowed']);
      expect(body.message).toMatch(/You worked on this case/);
    }
    expect(await stateOf(drafted.at)).toBe('in review');
  });

  it('is given as checked by an analyst with no part in the case, and as authored by authors only', async () => {
    const { at } = await aCaseToApprove(people);
    expect((await sign(people.secondAnalyst, at, 'authored')).status).toBe(403);
    expect((await sign(people.secondAnalyst, at, 'checked')).status).toBe(201);
    expect((await sign(people.secondAnalyst, at, 'checked')).body.code).toBe('already-there');
    expect((await sign(people.engineer, at, 'approved')).status).toBe(403);
    const contentHash = await contentHashOf(people.manager, at);
    const outside = { meaning: 'approved', password: testPassword, contentHash };
    expect((await people.outsider.client.post(`${at}/signatures`, outside)).status).toBe(404);
  });

  it('of an administrator who is manager too is that of the manager; of an administrator alone there is none', async () => {
    const { at } = await aCaseToApprove(people);
    const contentHash = await contentHashOf(people.manager, at);
    const crafted = { meaning: 'approved', password: testPassword, contentHash };
    expect((await people.administrator.client.post(`${at}/signatures`, crafted)).status).toBe(404);
    expect((await sign(chief, at, 'approved')).status).toBe(201);
    expect((await read(at)).signatures.at(-1)).toMatchObject({ printedName: 'Chief Both', meaning: 'approved' });
  });

  it('no longer matches once the case was sent back and written on', async () => {
    const { at, imageId } = await aCaseToApprove(people);
    await people.manager.client.post(`${at}/review/send-back`, { reasons: 'Name the scratch.' });
    const mark = { kind: 'note', geometry: { shape: 'point', at: { x: 9, y: 9 } }, certainty: 'likely' };
    await people.analyst.client.post(`${at}/fractographs/${imageId}/marks`, {
      ...mark,
      boundary: null,
      originCode: null,
      note: 'scratch',
    });
    await people.analyst.client.post(`${at}/review/send`);
    expect((await read(at)).signatures).toMatchObject([{ meaning: 'authored', matches: false }]);
    await acceptNotes(people.manager, at);
    const { status, body } = await sign(people.manager, at, 'approved');
    expect([status, body.code]).toEqual([409, 'not-ready']);
    expect(body.message).toMatch(/No author has signed/);
  });
});

describe('closing a case', () => {
  it('waits for every note to be accepted with a reason', async () => {
    const drafted = await aDraftedCase(people);
    const { estimates } = (await people.analyst.client.get(`${drafted.at}/estimates`)).body;
    const standing = { standing: 'set aside', reason: 'The gauge slipped.' };
    await people.analyst.client.post(`${drafted.at}/estimates/${estimates[1].id}/standing`, standing);
    await people.analyst.client.post(`${drafted.at}/review/send`);
    await sign(people.analyst, drafted.at, 'authored');
    const refused = await sign(people.manager, drafted.at, 'approved');
    expect([refused.status, refused.body.code]).toEqual([409, 'not-ready']);
    const note = 'No such note.';
    const unknown = await people.manager.client.post(`${drafted.at}/review/notes/accept`, { note, reason: 'x' });
    expect(unknown.status).toBe(422);
    await acceptNotes(people.manager, drafted.at);
    expect((await sign(people.manager, drafted.at, 'approved')).status).toBe(201);
  });

  it('gives a seal number, and chains each closure to the one before it', async () => {
    const one = await aClosedCase(people);
    const other = await aClosedCase(people);
    expect(readSealNumber(one.sealNumber)).toBe(one.sealNumber);
    const { rows } = await database.query(
      `select root_hash, previous_root_hash, case_id from closures where case_id = any($1) order by closed_at`,
      [[one.id, other.id]],
    );
    expect(rows[1].previous_root_hash).toBe(rows[0].root_hash);
    const { state, closure, parts } = await read(one.at);
    expect([state, closure.sealNumber, parts.length]).toEqual(['closed', one.sealNumber, 8]);
    expect(parts.every((part: { hash: string | null }) => part.hash !== null)).toBe(true);
  });

  it('by two managers at once makes one closure', async () => {
    const { at, id } = await aCaseToApprove(people);
    const answers = await Promise.all([sign(people.manager, at, 'approved'), sign(chief, at, 'approved')]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409]);
    const { rows } = await database.query('select count(*)::int as closures from closures where case_id = $1', [id]);
    expect(rows[0].closures).toBe(1);
  });

  it('of many cases at once keeps one chain', async () => {
    const cases = [];
    for (let n = 0; n < 4; n += 1) cases.push(await aCaseToApprove(people));
    const answers = await Promise.all(cases.map(({ at }) => sign(people.manager, at, 'approved')));
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201, 201]);
    const { rows } = await database.query<{ root_hash: string; previous_root_hash: string }>(
      'select root_hash, previous_root_hash from closures',
    );
    expect(new Set(rows.map((row) => row.previous_root_hash)).size).toBe(rows.length);
    expect(rows.filter((row) => row.previous_root_hash === '')).toHaveLength(1);
  });

  it('while a mark is written either has the mark in its list or refuses it, twenty times over', async () => {
    for (let n = 0; n < 20; n += 1) {
      const drafted = await aCaseToApprove(people);
      const contentHash = await contentHashOf(people.manager, drafted.at);
      const [closing, written] = await Promise.all([
        sign(people.manager, drafted.at, 'approved', { contentHash }),
        writeMark(drafted.id, drafted.imageId, n),
      ]);
      const { parts } = await read(drafted.at);
      const { whole } = (await people.manager.client.get(`${drafted.at}/review/check`)).body;
      if (closing.status === 201) {
        expect({ written, whole }).toEqual({ written: 'HB001', whole: true });
      } else {
        expect([closing.body.code, written]).toEqual(['stale-version', 'kept']);
        expect(parts.find((part: { key: string }) => part.key === 'marks').holding).toMatch(/^4 marks/);
      }
    }
  }, 120_000);
});

/** Writes a mark beneath the routes, as an act under way when the closing began would. */
async function writeMark(caseId: string, fractographId: string, n: number): Promise<string> {
  const client = new pg.Client({ connectionString: server.databaseUrl });
  await client.connect();
  // A little earlier or later each time, so that both come first now and then.
  await new Promise((done) => setTimeout(done, n * 5));
  try {
    await client.query(
      `insert into marks (id, case_id, fractograph_id, number, kind) values ($1, $2, $3, 99, 'note')`,
      [randomUUID(), caseId, fractographId],
    );
    return 'kept';
  } catch (error) {
    return error instanceof pg.DatabaseError ? (error.code ?? '') : String(error);
  } finally {
    await client.end();
  }
}

describe('a closed case looked over again', () => {
  it('still matches its list, row by row, file by file and number by number', async () => {
    const { at } = await aClosedCase(people);
    const { body } = await people.engineer.client.get(`${at}/review/check`);
    expect(body).toMatchObject({
      whole: true,
      estimates: [
        { number: 1, same: true },
        { number: 2, same: true },
      ],
    });
    expect(body.files).toEqual([{ words: 'Fig. 1, face.tif', outcome: 'same' }]);
    expect(body.signatures.map((each: { words: string }) => each.words)).toEqual([
      'Ana Lyst, authored',
      'Lab Manager, approved',
    ]);
  });

  it('still matches after the records it relied on were replaced, and after it was restricted', async () => {
    const { at, id } = await aClosedCase(people);
    const { rows } = await database.query<{ id: string; material_id: string }>(
      `select c.id, c.material_id from material_constants c join estimate_inputs i on i.source_id = c.id where i.case_id = $1`,
      [id],
    );
    const [used] = rows;
    const newer = { materialId: used.material_id, kind: 'mirror constant, outer', value: 8.9, expanded: 0.5 } as const;
    await aConstant(people, { ...newer, supersedesId: used.id });
    const { version } = (await people.manager.client.get(at)).body;
    const wall = { restricted: true, namedPersonIds: [people.manager.person.id], versionSeen: version };
    expect((await people.manager.client.put(`${at}/restriction`, wall)).status).toBe(200);
    expect((await people.manager.client.get(`${at}/review/check`)).body.whole).toBe(true);
  });

  it('names the file of which one byte was changed', async () => {
    const { at, sha256 } = await aClosedCase(people);
    await writeFile(await server.parts.storage.originalFile(sha256), 'another byte');
    const { body } = await people.manager.client.get(`${at}/review/check`);
    expect(body.whole).toBe(false);
    expect(body.files).toEqual([{ words: 'Fig. 1, face.tif', outcome: 'changed' }]);
  });

  it('names the record that was changed behind its back', async () => {
    const { at, id } = await aClosedCase(people);
    await behindItsBack(`update mark_versions set certainty = 'possible' where case_id = '${id}' and version = 1`);
    const { body } = await people.manager.client.get(`${at}/review/check`);
    const part = body.parts.find((each: { key: string }) => each.key === 'marks');
    expect([body.whole, part.outcome, part.deviations.length]).toEqual([false, 'changed', 3]);
  });

  it('names the estimate that no longer comes out of its inputs, and the signature moved to other content', async () => {
    const { at, id } = await aClosedCase(people);
    await behindItsBack(
      `update estimates set stress_mpa = stress_mpa + 1 where case_id = '${id}' and number = 1`,
      `update signatures set content_hash = repeat('a', 64) where case_id = '${id}' and meaning = 'authored'`,
    );
    const { body } = await people.manager.client.get(`${at}/review/check`);
    expect(body.estimates).toEqual([
      { number: 1, same: false },
      { number: 2, same: true },
    ]);
    expect(body.signatures).toMatchObject([{ outcome: 'changed' }, { outcome: 'same' }]);
    expect((await read(at)).signatures).toMatchObject([{ matches: false }, { matches: true }]);
  });

  it('names a changed trail, list and closing time', async () => {
    const { at, id } = await aClosedCase(people);
    await behindItsBack(
      `update audit_entries set person_name = 'No One' where chain = '${id}' and act = 'signature.given'`,
      `update closures set manifest = jsonb_set(manifest, '{parts,0,hash}', '"x"') where case_id = '${id}'`,
      `update cases set closed_at = closed_at - interval '1 day' where id = '${id}'`,
    );
    const { body } = await people.manager.client.get(`${at}/review/check`);
    const outcomes = Object.fromEntries(
      body.seal.map((each: { words: string; outcome: string }) => [each.words, each.outcome]),
    );
    expect(outcomes).toEqual({
      'The list of what is sealed': 'changed',
      'The seal number': 'changed',
      'When it was closed': 'changed',
      'The closure before it': 'same',
      'The chain of who did what': 'changed',
    });
  });
});

/** What only the owner of the database could do, and the seal is there to show. */
async function behindItsBack(...statements: string[]): Promise<void> {
  await database.query('begin');
  await database.query(`set local session_replication_role = 'replica'`);
  for (const statement of statements) await database.query(statement);
  await database.query('commit');
}
