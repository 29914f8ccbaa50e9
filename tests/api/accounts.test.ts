import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { mailsTo, tokenSentTo } from '../support/mailbox.ts';
import { aLaboratory, admit, startTestServer, testPassword, type TestServer } from '../support/test-server.ts';

const chosen = 'mist before hackle';
let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let now = new Date('2026-10-01T08:00:00Z');

beforeAll(async () => {
  server = await startTestServer({ clock: () => now });
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const rowsOf = async (query: string, values: unknown[] = []) =>
  (await server.parts.database.pool.query(query, values)).rows;
const account = async (id: string) =>
  (await people.administrator.client.get('/people')).body.accounts.find((one: { id: string }) => one.id === id);
const entryFor = (mail: string) => ({ name: 'New Comer', mail, organisationId: people.maker.id, roles: ['requester'] });

async function invite(mail: string) {
  const answered = await people.administrator.client.post('/people', entryFor(mail));
  expect(answered.status).toBe(201);
  return { id: answered.body.id as string, token: await tokenSentTo(server, mail) };
}

async function visitor() {
  const client = server.visitor();
  await client.session();
  return client;
}

describe('an invitation', () => {
  it('is accepted over its link by choosing a password, which signs the person in', async () => {
    const { id, token } = await invite('first@maker.example');
    const client = await visitor();
    expect((await client.get(`/invitations/${token}`)).body).toEqual({
      name: 'New Comer',
      mail: 'first@maker.example',
      organisationName: 'Test Maker',
    });
    const accepted = await client.post(`/invitations/${token}`, { password: chosen });
    expect(accepted.body.person).toMatchObject({ id, roles: ['requester'] });
    expect((await server.visitor().signIn('first@maker.example', chosen)).status).toBe(201);
  });

  it('keeps its token only as a hash, and no link once its mail has gone', async () => {
    const { id, token } = await invite('hashed@maker.example');
    const links = await rowsOf('select * from one_time_links where person_id = $1', [id]);
    expect(links).toHaveLength(1);
    expect(JSON.stringify(links)).not.toContain(token);
    const mails = await rowsOf('select * from outgoing_mails where to_mail = $1', ['hashed@maker.example']);
    expect(mails).toMatchObject([{ state: 'gone', link: null }]);
    const trail = await rowsOf('select * from audit_entries where object_id = $1', [id]);
    expect(JSON.stringify([mails, trail])).not.toContain(token);
  });

  it('refuses a short password and one with the own name in it, and stays open for a better one', async () => {
    const { token } = await invite('careless@maker.example');
    const client = await visitor();
    for (const password of ['too short', 'careless@maker.example', 'my name is comer!']) {
      const refused = await client.post(`/invitations/${token}`, { password });
      expect(refused.body).toMatchObject({ code: 'not-valid', field: 'password' });
    }
    expect((await client.post(`/invitations/${token}`, { password: chosen })).status).toBe(201);
  });

  it('works once: of two who accept at the same moment one wins', async () => {
    const { token } = await invite('twice@maker.example');
    const [one, other] = [await visitor(), await visitor()];
    const answers = await Promise.all([
      one.post(`/invitations/${token}`, { password: chosen }),
      other.post(`/invitations/${token}`, { password: `${chosen} too` }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 410]);
    expect((await (await visitor()).get(`/invitations/${token}`)).body.code).toBe('link-spent');
  });

  it('accepted while it is sent again opens the account or is refused, and never fails', async () => {
    for (let round = 0; round < 6; round += 1) {
      const { id, token } = await invite(`crossing-${round}@maker.example`);
      const client = await visitor();
      const [accepted, again] = await Promise.all([
        client.post(`/invitations/${token}`, { password: chosen }),
        people.administrator.client.post(`/people/${id}/invitation`),
      ]);
      expect([
        [201, 409],
        [410, 204],
      ]).toContainEqual([accepted.status, again.status]);
    }
  });

  it('answers alike for a link never made, run out, taken back and replaced', async () => {
    const takenBack = await invite('back@maker.example');
    await people.administrator.client.delete(`/people/${takenBack.id}/invitation`);
    const replaced = await invite('again@maker.example');
    await people.administrator.client.post(`/people/${replaced.id}/invitation`);
    const newToken = await tokenSentTo(server, 'again@maker.example', 2);
    const late = await invite('late@maker.example');
    const client = await visitor();
    expect((await client.get(`/invitations/${newToken}`)).status).toBe(200);
    now = new Date(now.getTime() + 7.01 * 24 * 3_600_000);
    const answers = [];
    for (const token of ['never-made', takenBack.token, replaced.token, late.token])
      answers.push((await client.post(`/invitations/${token}`, { password: chosen })).body);
    for (const answer of answers) expect(answer).toEqual(answers[0]);
    expect(answers[0].code).toBe('link-spent');
  });

  it('follows a corrected address, and its old link dies', async () => {
    const { id, token } = await invite('mistyped@maker.example');
    const { version } = await account(id);
    await people.administrator.client.patch(`/people/${id}`, { ...entryFor('right@maker.example'), version });
    await mailsTo(server, 'right@maker.example');
    const client = await visitor();
    expect((await client.get(`/invitations/${token}`)).status).toBe(410);
    expect((await client.get(`/invitations/${await tokenSentTo(server, 'right@maker.example')}`)).status).toBe(200);
  });

  it('is not sent twice to one address', async () => {
    await invite('known@maker.example');
    const again = await people.administrator.client.post('/people', entryFor('KNOWN@maker.example'));
    expect(again.body).toMatchObject({ code: 'already-there', field: 'mail' });
  });

  it('gives the roles of the laboratory to its own people only', async () => {
    for (const role of ['analyst', 'manager', 'administrator']) {
      const entry = { ...entryFor(`${role}@maker.example`), roles: ['engineer', role] };
      const refused = await people.administrator.client.post('/people', entry);
      expect(refused.body).toMatchObject({ code: 'not-valid', field: 'roles' });
    }
  });
});

describe('a new password', () => {
  const ask = async (mail: string) => (await visitor()).post('/password-links', { mail });

  it('is asked for with the same answer for any address, and a mail goes only to an open account', async () => {
    const known = await ask(people.analyst.mail);
    const unknown = await ask('nobody-at-all@test.example');
    expect([known.status, unknown.status]).toEqual([204, 204]);
    await tokenSentTo(server, people.analyst.mail);
    expect(await rowsOf('select 1 from outgoing_mails where to_mail like $1', ['nobody-at-all%'])).toHaveLength(0);
  });

  it('set over the link ends every session, and the link works once and for an hour', async () => {
    const { client, mail } = people.secondAnalyst;
    await ask(mail);
    const token = await tokenSentTo(server, mail);
    expect((await client.get('/me')).status).toBe(200);
    const visiting = await visitor();
    const answers = await Promise.all([
      visiting.post(`/password-links/${token}`, { password: chosen }),
      visiting.post(`/password-links/${token}`, { password: chosen }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 410]);
    expect((await client.get('/me')).body.code).toBe('not-signed-in');
    expect((await client.signIn(mail, testPassword)).status).toBe(401);
    expect((await client.signIn(mail, chosen)).status).toBe(201);
    await ask(mail);
    const second = await tokenSentTo(server, mail, 2);
    now = new Date(now.getTime() + 61 * 60_000);
    expect((await visiting.post(`/password-links/${second}`, { password: chosen })).body.code).toBe('link-spent');
  });

  it('is not mailed without end: three links an hour at most', async () => {
    for (let asked = 0; asked < 5; asked += 1) await ask(people.manager.mail);
    await mailsTo(server, people.manager.mail, 3);
    await expect.poll(async () => (await rowsOf('select 1 from graphile_worker.jobs')).length).toBe(0);
    expect(await mailsTo(server, people.manager.mail, 3)).toHaveLength(3);
  });

  it('can be changed by its owner with the current one; the session here goes on, others end', async () => {
    const { client, mail } = people.engineer;
    const there = server.visitor();
    await there.signIn(mail, testPassword);
    const wrong = await client.put('/me/password', { current: 'not this one', password: chosen });
    expect(wrong.body).toMatchObject({ code: 'not-valid', field: 'current' });
    expect((await client.put('/me/password', { current: testPassword, password: chosen })).status).toBe(204);
    expect((await client.get('/me')).status).toBe(200);
    expect((await there.get('/me')).body.code).toBe('not-signed-in');
  });
});

describe('an account', () => {
  it('loses its sessions and links at once when it is closed, and other processes are told', async () => {
    const leaver = await admit(server, { name: 'Parting Soul', organisationId: people.maker.id, roles: ['requester'] });
    const listener = await server.parts.database.pool.connect();
    const heard: string[] = [];
    listener.on('notification', ({ payload }) => heard.push(payload ?? ''));
    await listener.query('listen hb_person');
    const { version } = await account(leaver.person.id);
    await people.administrator.client.post(`/people/${leaver.person.id}/closing`, { version });
    expect((await leaver.client.get('/me')).body.code).toBe('not-signed-in');
    const query = `select 1 from sessions where sess -> 'passport' ->> 'user' = $1`;
    expect(await rowsOf(query, [leaver.person.id])).toHaveLength(0);
    expect((await leaver.client.signIn(leaver.mail, testPassword)).status).toBe(401);
    await expect.poll(() => heard).toContainEqual(JSON.stringify({ id: leaver.person.id }));
    await listener.query('unlisten hb_person');
    listener.release();
  });

  it('can be opened again and keeps its password', async () => {
    const back = await admit(server, { name: 'Coming Back', organisationId: people.maker.id, roles: ['requester'] });
    const { version } = await account(back.person.id);
    await people.administrator.client.post(`/people/${back.person.id}/closing`, { version });
    await people.administrator.client.post(`/people/${back.person.id}/opening`, { version: version + 1 });
    expect((await back.client.signIn(back.mail, testPassword)).status).toBe(201);
  });

  it('holds its new roles from the next request on', async () => {
    const riser = await admit(server, {
      name: 'Rising Star',
      organisationId: people.laboratory.id,
      roles: ['analyst'],
    });
    expect((await riser.client.get('/people')).status).toBe(403);
    const { version, mail } = await account(riser.person.id);
    const entry = {
      name: 'Rising Star',
      mail,
      organisationId: people.laboratory.id,
      roles: ['analyst', 'administrator'],
    };
    await people.administrator.client.patch(`/people/${riser.person.id}`, { ...entry, version });
    expect((await riser.client.get('/people')).status).toBe(200);
    await people.administrator.client.patch(`/people/${riser.person.id}`, {
      ...entry,
      roles: ['analyst'],
      version: version + 1,
    });
  });

  it('changed by two administrators at once takes one change and shows the other what stands', async () => {
    const both = await admit(server, { name: 'Pulled Twoways', organisationId: people.maker.id, roles: ['requester'] });
    const { version } = await account(both.person.id);
    const change = (name: string) =>
      people.administrator.client.patch(`/people/${both.person.id}`, {
        ...entryFor(both.mail),
        name,
        version,
      });
    const answers = await Promise.all([change('One Name'), change('Other Name')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 409]);
    const refused = answers.find(({ status }) => status === 409);
    expect(refused?.body.code).toBe('stale-version');
    expect(refused?.body.current.name).toBe((await account(both.person.id)).name);
  });

  it('of the last administrator can neither be closed nor lose the role, also when two do it at once', async () => {
    const second = await admit(server, {
      name: 'Second Keeper',
      organisationId: people.laboratory.id,
      roles: ['administrator'],
    });
    const close = async (id: string) =>
      people.administrator.client.post(`/people/${id}/closing`, { version: (await account(id)).version });
    const answers = await Promise.all([close(people.administrator.person.id), close(second.person.id)]);
    const closings = answers.filter(({ status }) => status === 204);
    expect(closings).toHaveLength(1);
    const left = await rowsOf(
      `select p.id, p.mail from people p join person_roles r on r.person_id = p.id
       where r.role = 'administrator' and p.state = 'open'`,
    );
    expect(left).toHaveLength(1);
    const client = server.visitor();
    await client.signIn(left[0].mail, testPassword);
    people.administrator.client = client;
    const row = await account(left[0].id);
    const refused = await client.patch(`/people/${row.id}`, { ...row, roles: ['analyst'] });
    expect(refused.body).toMatchObject({ code: 'wrong-state', field: 'roles' });
  });
});

describe('an organisation', () => {
  it('is entered once under its name and can be renamed', async () => {
    const { client } = people.administrator;
    const entered = await client.post('/organisations', { name: 'Hexlund Lamps', kind: 'outside' });
    expect(entered.status).toBe(201);
    const twice = await client.post('/organisations', { name: 'hexlund lamps', kind: 'maker' });
    expect(twice.body).toMatchObject({ code: 'already-there', field: 'name' });
    const { id, version } = entered.body;
    expect((await client.patch(`/organisations/${id}`, { name: 'Hexlund Light', version })).body.name).toBe(
      'Hexlund Light',
    );
    expect((await client.patch(`/organisations/${id}`, { name: 'Hexlund', version })).body.code).toBe('stale-version');
  });
});

describe('the laboratory itself', () => {
  it('stands once in a book', async () => {
    const second = await people.administrator.client.post('/organisations', { name: 'Another', kind: 'laboratory' });
    expect(second.body).toMatchObject({ code: 'already-there', field: 'kind' });
  });
});

describe('own settings', () => {
  it('follow the person to the next sign-in', async () => {
    const { client, mail } = people.requester;
    await client.patch('/me/settings', { theme: 'bench light', roomyRows: true });
    const elsewhere = await server.visitor().signIn(mail, testPassword);
    expect(elsewhere.body.settings).toEqual({ theme: 'bench light', roomyRows: true, letterKeys: true });
  });

  it('change the own name, but not over a version not seen', async () => {
    const { client } = people.requester;
    const { version } = (await client.get('/me')).body;
    expect((await client.patch('/me', { name: 'Maker Asker', version })).body.name).toBe('Maker Asker');
    expect((await client.patch('/me', { name: 'Another', version })).body.code).toBe('stale-version');
  });
});

describe('the administration', () => {
  const routes = [
    ['GET', '/people'],
    ['POST', '/people'],
    ['PATCH', '/people/0198e6a0-0000-7000-8000-000000000000'],
    ['POST', '/people/0198e6a0-0000-7000-8000-000000000000/closing'],
    ['POST', '/people/0198e6a0-0000-7000-8000-000000000000/opening'],
    ['POST', '/people/0198e6a0-0000-7000-8000-000000000000/invitation'],
    ['DELETE', '/people/0198e6a0-0000-7000-8000-000000000000/invitation'],
    ['POST', '/organisations'],
    ['PATCH', '/organisations/0198e6a0-0000-7000-8000-000000000000'],
    ['GET', '/laboratory'],
    ['GET', '/mail'],
    ['POST', '/mail/0198e6a0-0000-7000-8000-000000000000/again'],
    ['GET', '/held-mail'],
    ['POST', '/held-mail/0198e6a0-0000-7000-8000-000000000000/opening'],
    ['GET', '/trail'],
    ['GET', '/trail/check'],
  ] as const;

  it.each(['requester', 'makerEngineer', 'outsider', 'analyst', 'manager'] as const)(
    'is closed to a %s',
    async (who) => {
      for (const [method, path] of routes) {
        const answered = await people[who].client.ask(method, path, method === 'GET' ? undefined : {});
        expect([path, answered.status]).toEqual([path, 403]);
      }
    },
  );

  it('is closed to a visitor', async () => {
    const client = await visitor();
    for (const [method, path] of routes) {
      const answered = await client.ask(method, path, method === 'GET' ? undefined : {});
      expect([path, answered.body.code]).toEqual([path, 'not-signed-in']);
    }
  });
});
