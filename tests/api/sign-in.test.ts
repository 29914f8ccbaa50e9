import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aLaboratory, startTestServer, testPassword, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

describe('signing in', () => {
  it('tells a visitor nothing but a token for the next request', async () => {
    const { body } = await server.visitor().session();
    expect(body).toEqual({ person: null, settings: null, requestToken: expect.any(String) });
  });

  it('says the same of a wrong password and of an address nobody has', async () => {
    const wrongPassword = await server.visitor().signIn(people.analyst.mail, 'not the password');
    const nobody = await server.visitor().signIn('nobody@test.example', testPassword);
    expect(wrongPassword.status).toBe(401);
    expect(nobody.body).toEqual(wrongPassword.body);
  });

  it('refuses a change that does not carry the token of its session', async () => {
    const client = server.visitor();
    const answered = await client.post('/session', { mail: people.analyst.mail, password: testPassword });
    expect(answered.body.code).toBe('forged-request');
  });

  it('leaves nothing of the session after signing out', async () => {
    const client = server.visitor();
    await client.signIn(people.analyst.mail, testPassword);
    expect((await client.session()).body.person.mail).toBe(people.analyst.mail);
    await client.delete('/session');
    expect((await client.session()).body.person).toBeNull();
  });
});
