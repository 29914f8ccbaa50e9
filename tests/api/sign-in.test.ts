import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { aLaboratory, startTestServer, testPassword, type TestServer } from '../support/test-server.ts';

const minute = 60_000;
let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let now = new Date('2026-10-01T08:00:00Z');

beforeAll(async () => {
  server = await startTestServer({ clock: () => now });
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const later = (minutes: number) => (now = new Date(now.getTime() + minutes * minute));
const tryAs = (mail: string, password: string) => server.visitor().signIn(mail, password);
const forgetAllTries = () => server.parts.database.pool.query('delete from sign_in_tries');

describe('signing in', () => {
  it('tells a visitor nothing but a token for the next request', async () => {
    const { body } = await server.visitor().session();
    expect(body).toEqual({ person: null, settings: null, requestToken: expect.any(String) });
  });

  it('says the same of a wrong password and of an address nobody has', async () => {
    const wrongPassword = await tryAs(people.analyst.mail, 'not the password');
    const nobody = await tryAs('nobody@test.example', testPassword);
    expect(wrongPassword.status).toBe(401);
    expect(nobody.body).toEqual(wrongPassword.body);
  });

  it('refuses a change that does not carry the token of its session', async () => {
    const client = server.visitor();
    const answered = await client.post('/session', { mail: people.analyst.mail, password: testPassword });
    expect(answered.body.code).toBe('forged-request');
  });

  it('takes the mail address in any case and with spaces round it', async () => {
    const answered = await tryAs(` ${people.analyst.mail.toUpperCase()} `, testPassword);
    expect(answered.body.person.id).toBe(people.analyst.person.id);
  });

  it('begins a new session, so that one known before opens nothing', async () => {
    const client = server.visitor();
    await client.session();
    const before = client.cookie;
    await client.signIn(people.analyst.mail, testPassword);
    expect(client.cookie).not.toBe(before);
  });

  it('leaves nothing of the session after signing out', async () => {
    const client = server.visitor();
    await client.signIn(people.analyst.mail, testPassword);
    expect((await client.session()).body.person.mail).toBe(people.analyst.mail);
    await client.delete('/session');
    expect((await client.session()).body.person).toBeNull();
  });

  it('ends every session of the person when they sign out everywhere, and nobody else’s', async () => {
    const [here, there] = [server.visitor(), server.visitor()];
    await here.signIn(people.secondAnalyst.mail, testPassword);
    await there.signIn(people.secondAnalyst.mail, testPassword);
    expect((await here.delete('/me/sessions')).status).toBe(204);
    expect((await there.get('/me')).body.code).toBe('not-signed-in');
    expect((await here.get('/me')).body.code).toBe('not-signed-in');
    expect((await people.engineer.client.get('/me')).status).toBe(200);
  });
});

describe('failed tries', () => {
  beforeEach(async () => {
    later(24 * 60);
    await forgetAllTries();
  });

  it('lock an address after the fifth for five minutes, the right password too', async () => {
    for (let tries = 0; tries < 5; tries += 1) await tryAs(people.manager.mail, 'wrong');
    const locked = await tryAs(people.manager.mail, testPassword);
    expect(locked.status).toBe(429);
    expect(locked.body).toMatchObject({ code: 'too-many-tries', message: expect.stringContaining('5 minutes') });
    later(5.1);
    expect((await tryAs(people.manager.mail, testPassword)).status).toBe(201);
  });

  it('tell nothing about whether the address is known, invited, open or closed, at any of the tries', async () => {
    const pool = server.parts.database.pool;
    const setState = (state: string, id: string) =>
      pool.query('update people set state = $1 where id = $2', [state, id]);
    await setState('closed', people.outsider.person.id);
    await setState('invited', people.makerEngineer.person.id);
    const addresses = ['nobody@test.example', people.analyst.mail, people.outsider.mail, people.makerEngineer.mail];
    for (let tries = 1; tries <= 7; tries += 1) {
      const answers = [];
      for (const mail of addresses)
        answers.push(await tryAs(mail, mail === people.analyst.mail ? 'wrong' : testPassword));
      const [first] = answers;
      for (const answer of answers) expect([answer.status, answer.body]).toEqual([first?.status, first?.body]);
      expect(first?.status).toBe(tries <= 5 ? 401 : 429);
    }
    await setState('open', people.outsider.person.id);
    await setState('open', people.makerEngineer.person.id);
  });

  it('wait longer each time the wait is over and the next try fails again', async () => {
    for (let tries = 0; tries < 5; tries += 1) await tryAs(people.manager.mail, 'wrong');
    later(5.1);
    await tryAs(people.manager.mail, 'wrong');
    expect((await tryAs(people.manager.mail, testPassword)).body.message).toContain('10 minutes');
    later(10.1);
    await tryAs(people.manager.mail, 'wrong');
    expect((await tryAs(people.manager.mail, testPassword)).body.message).toContain('20 minutes');
  });

  it('are forgotten after a quarter of an hour, and once the person has come in', async () => {
    for (let tries = 0; tries < 4; tries += 1) await tryAs(people.manager.mail, 'wrong');
    later(15.1);
    const first = await tryAs(people.manager.mail, 'wrong');
    expect(first.body.message).toBe('This address and password do not belong together.');
    await tryAs(people.manager.mail, testPassword);
    for (let tries = 0; tries < 4; tries += 1) await tryAs(people.manager.mail, 'wrong');
    expect((await tryAs(people.manager.mail, testPassword)).status).toBe(201);
  });

  it('are counted before the password is looked at, so that many at once are no more than five', async () => {
    const clients = await Promise.all(
      Array.from({ length: 12 }, async () => {
        const client = server.visitor();
        await client.session();
        return client;
      }),
    );
    const answers = await Promise.all(
      clients.map((client) => client.post('/session', { mail: people.manager.mail, password: 'wrong' })),
    );
    expect(answers.filter(({ status }) => status === 401)).toHaveLength(5);
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(7);
  });

  it('from one machine lock that machine, whatever addresses were tried', async () => {
    for (let tries = 0; tries < 30; tries += 1) await tryAs(`nobody-${tries}@test.example`, 'wrong');
    expect((await tryAs(people.engineer.mail, testPassword)).status).toBe(429);
  });

  it('keep neither the address typed nor the machine in readable form', async () => {
    await tryAs('a-password-typed-here', 'wrong');
    const { rows } = await server.parts.database.pool.query<{ key: string }>('select key from sign_in_tries');
    expect(rows).toHaveLength(2);
    for (const { key } of rows) expect(key).toMatch(/^(mail|machine):[0-9a-f]{64}$/);
  });
});
