import { setTimeout as wait } from 'node:timers/promises';
import { sql } from 'drizzle-orm';
import pino from 'pino';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import WebSocket from 'ws';
import { openCaseEvents } from '#server/collaboration/case-events.ts';
import type { LiveNews } from '#shared/contracts/live.ts';
import { aCalibration, aCase, aFractograph } from '../support/a-bar-case.ts';
import { aLaboratory, startTestServer, type Admitted, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
const opened: WebSocket[] = [];

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(async () => {
  opened.forEach((socket) => socket.terminate());
  await server.stop();
});

/** Opens the socket of a case as a browser would; what it hears is gathered. */
async function listening(person: Admitted, number: string, origin = server.address) {
  const address = `${server.address.replace('http', 'ws')}/sockets/live/${number}`;
  const socket = new WebSocket(address, { origin, headers: { cookie: person.client.cookie } });
  opened.push(socket);
  const heard: LiveNews[] = [];
  socket.on('message', (data) => heard.push(JSON.parse(String(data))));
  const outcome = await new Promise<string>((done) => {
    socket.once('open', () => done('open'));
    socket.once('unexpected-response', (_request, response) => done(String(response.statusCode)));
    socket.once('error', () => done('error'));
  });
  return { socket, heard, outcome };
}

async function until(holds: () => boolean): Promise<void> {
  for (let tries = 0; tries < 150 && !holds(); tries += 1) await wait(30);
  expect(holds()).toBe(true);
}

describe('a case open at two screens', () => {
  it('tells the second what the first has drawn', async () => {
    const { id, number } = await aCase(people);
    const image = await aFractograph(people, id, 1, await aCalibration(people, 1));
    const second = await listening(people.secondAnalyst, number);
    const { body } = await people.analyst.client.post(`/cases/${number}/fractographs/${image.id}/marks`, {
      kind: 'origin',
      geometry: { shape: 'point', at: { x: 5, y: 5 } },
      certainty: 'certain',
      boundary: null,
      originCode: '?',
      note: '',
    });
    await until(() => second.heard.some((news) => news.kind === 'act' && news.act === 'mark.drawn'));
    expect(second.heard).toContainEqual({
      kind: 'act',
      act: 'mark.drawn',
      objectId: body.id,
      by: people.analyst.person.id,
    });
  });

  it('says who is here and where, and that they have gone', async () => {
    const { number } = await aCase(people);
    const first = await listening(people.analyst, number);
    const second = await listening(people.manager, number);
    second.socket.send(JSON.stringify({ kind: 'at', place: 'findings' }));
    const lastHere = () => first.heard.filter((news) => news.kind === 'here').at(-1)?.people ?? [];
    await until(() => lastHere().some(({ name, place }) => name === 'Lab Manager' && place === 'findings'));
    second.socket.close();
    await until(() => lastHere().every(({ name }) => name !== 'Lab Manager'));
  });

  it('shows people of another server process too', async () => {
    const { number } = await aCase(people);
    const first = await listening(people.analyst, number);
    const elsewhere = {
      process: 'another',
      number,
      people: [{ id: people.manager.person.id, name: 'Far Off', place: '' }],
    };
    await server.parts.database.db.execute(sql`select pg_notify('hb_presence', ${JSON.stringify(elsewhere)})`);
    await until(() =>
      first.heard.some((news) => news.kind === 'here' && news.people.some(({ name }) => name === 'Far Off')),
    );
  });

  it('hears again after the database connection was lost, and says that news may have been missed', async () => {
    const { number } = await aCase(people);
    const first = await listening(people.analyst, number);
    await server.parts.database.db.execute(
      sql`select pg_terminate_backend(pid) from pg_stat_activity where datname = current_database() and application_name = 'hacklebook news'`,
    );
    await until(() => first.heard.some((news) => news.kind === 'missed some'));
  });
});

describe('the socket of a case', () => {
  it('is not there for who may not read the case', async () => {
    const { number } = await aCase(people);
    expect((await listening(people.requester, number)).outcome).toBe('404');
    expect((await listening(people.outsider, number)).outcome).toBe('404');
    expect((await listening(people.administrator, number)).outcome).toBe('404');
    expect((await listening(people.analyst, 'HB-2026-9999')).outcome).toBe('404');
  });

  it('is refused without a session and from another site', async () => {
    const { number } = await aCase(people);
    const visitor = { ...people.analyst, client: server.visitor() };
    expect((await listening(visitor, number)).outcome).toBe('401');
    expect((await listening(people.analyst, number, 'https://elsewhere.example')).outcome).toBe('403');
  });

  it('closes when the person is signed out everywhere', async () => {
    const { number } = await aCase(people);
    const { socket } = await listening(people.engineer, number);
    const closed = new Promise<number>((done) => socket.once('close', done));
    const news = JSON.stringify({ id: people.engineer.person.id });
    await server.parts.database.db.execute(sql`select pg_notify('hb_person', ${news})`);
    expect(await closed).toBe(4401);
  });

  it('closes when a wall goes up round the case', async () => {
    const { number } = await aCase(people);
    const { socket } = await listening(people.secondAnalyst, number);
    const closed = new Promise<number>((done) => socket.once('close', done));
    await server.parts.database.db.execute(sql`update cases set restricted = true where number = ${number}`);
    const news = JSON.stringify({ number, act: 'case.restricted', objectId: null, by: null });
    await server.parts.database.db.execute(sql`select pg_notify('hb_case', ${news})`);
    expect(await closed).toBe(4403);
  });

  it('is ended at once when the server stops', async () => {
    const before = Date.now();
    const events = await openCaseEvents(server.parts, { databaseUrl: server.databaseUrl }, pino({ level: 'silent' }));
    await events.stop();
    expect(Date.now() - before).toBeLessThan(2000);
  });
});
