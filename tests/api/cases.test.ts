import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { caseFacts, openedCase, restrict } from '../support/cases-at-hand.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const aCase = (more = {}) => openedCase(people, more);

describe('case numbers', () => {
  it('run from 1 without gap or double when forty people open a case at once, and one of them fails', async () => {
    const other = await startTestServer();
    const staff = await aLaboratory(other);
    const opened = Array.from({ length: 41 }, (_, index) =>
      staff.analyst.client.post('/cases', {
        ...caseFacts(staff),
        // The twentieth names a material nobody entered, and fails after its number was taken.
        ...(index === 19 ? { materialId: '01990000-0000-7000-8000-000000000000' } : {}),
      }),
    );
    const answers = await Promise.all(opened);
    const numbers = answers.filter(({ status }) => status === 201).map(({ body }) => body.number);
    const year = new Date().getUTCFullYear();
    const wanted = Array.from({ length: 40 }, (_, index) => `HB-${year}-${String(index + 1).padStart(4, '0')}`);
    expect(numbers.toSorted()).toEqual(wanted);
    await other.stop();
  });
});

describe('a case seen from outside', () => {
  it('is told to its requester in plain words and with nothing of its content', async () => {
    const { number } = await aCase();
    const { body } = await people.requester.client.get(`/cases/${number}`);
    expect(Object.keys(body).toSorted()).toEqual(
      ['number', 'plainState', 'receivedAt', 'seenAs', 'stateSince', 'title'].toSorted(),
    );
  });

  it('is not there, in the same words, for another organisation as one that never was', async () => {
    const { number } = await aCase();
    const forbidden = await people.outsider.client.get(`/cases/${number}`);
    const absent = await people.outsider.client.get('/cases/HB-2026-9999');
    const malformed = await people.outsider.client.get('/cases/HB-1');
    expect(forbidden.status).toBe(404);
    expect(forbidden.body).toEqual(absent.body);
    expect(forbidden.body).toEqual(malformed.body);
  });

  it('shows its questions, background and trail to no requester', async () => {
    const { number } = await aCase();
    for (const part of ['questions', 'background', 'history'])
      expect((await people.requester.client.get(`/cases/${number}/${part}`)).status).toBe(403);
  });

  it('once restricted, is there only for the people named', async () => {
    const { number } = await aCase();
    await restrict(people, number, [people.secondAnalyst.person.id]);
    expect((await people.secondAnalyst.client.get(`/cases/${number}`)).status).toBe(200);
    expect((await people.analyst.client.get(`/cases/${number}`)).body.code).toBe('not-found');
    expect((await people.engineer.client.get(`/cases/${number}`)).body.code).toBe('not-found');
    expect((await people.manager.client.get(`/cases/${number}`)).body.namedPeople).toHaveLength(2);
  });
});

describe('the path of a case', () => {
  it('moves on and back by hand, each move in its trail', async () => {
    const { number } = await aCase();
    const move = (to: string, versionSeen: number) =>
      people.analyst.client.post(`/cases/${number}/moves`, { to, versionSeen });
    expect((await move('examining', 1)).body.state).toBe('examining');
    expect((await move('drafting', 2)).body.state).toBe('drafting');
    expect((await move('examining', 3)).body.state).toBe('examining');
    const { body } = await people.analyst.client.get(`/cases/${number}/history`);
    expect(body.entries.map(({ words }: { words: string }) => words)).toEqual([
      'moved the case to examining',
      'moved the case to drafting',
      'moved the case to examining',
      'agreed the questions',
      'opened the case',
    ]);
  });

  it('skips no state, and stays where it was', async () => {
    const { number } = await aCase();
    const refused = await people.analyst.client.post(`/cases/${number}/moves`, { to: 'drafting', versionSeen: 1 });
    expect(refused.body).toMatchObject({ code: 'wrong-state', stillHolds: 'The case stays received.' });
  });

  it('rests while it is on hold, and goes on from where it was', async () => {
    const { number } = await aCase();
    const hold = { reason: 'waits for the second panel', until: '2099-03-20', versionSeen: 1 };
    await people.manager.client.put(`/cases/${number}/hold`, hold);
    const moved = await people.analyst.client.post(`/cases/${number}/moves`, { to: 'examining', versionSeen: 2 });
    expect(moved.body.code).toBe('wrong-state');
    const { body } = await people.analyst.client.delete(`/cases/${number}/hold`, { versionSeen: 2 });
    expect(body).toMatchObject({ hold: null, state: 'received' });
  });

  it('is not held until a day that is past', async () => {
    const { number } = await aCase();
    const hold = { reason: 'waits', until: '2020-01-01', versionSeen: 1 };
    expect((await people.analyst.client.put(`/cases/${number}/hold`, hold)).body.field).toBe('until');
  });

  it('ends for good when the case is withdrawn, with a reason', async () => {
    const { number } = await aCase();
    const path = `/cases/${number}/withdrawal`;
    expect((await people.analyst.client.post(path, { reason: ' ', versionSeen: 1 })).body.code).toBe('not-valid');
    const withdrawn = await people.analyst.client.post(path, { reason: 'pieces went back unread', versionSeen: 1 });
    expect(withdrawn.body).toMatchObject({ state: 'withdrawn', withdrawnReason: 'pieces went back unread' });
    const moved = await people.analyst.client.post(`/cases/${number}/moves`, { to: 'examining', versionSeen: 2 });
    expect(moved.body.code).toBe('wrong-state');
  });
});

describe('who may do what in a case', () => {
  it('lets analysts take a case and managers give it, and says so to colleagues', async () => {
    const { number } = await aCase();
    const taken = await people.analyst.client.post(`/cases/${number}/taken`, { versionSeen: 1 });
    expect(taken.body.assignedTo.name).toBe('Ana Lyst');
    const given = { personId: people.secondAnalyst.person.id, versionSeen: 2 };
    expect((await people.analyst.client.put(`/cases/${number}/holder`, given)).body.code).toBe('not-allowed');
    const answered = await people.manager.client.put(`/cases/${number}/holder`, given);
    expect(answered.body.assignedTo.name).toBe('Second Reader');
  });

  it('gives no case to a manager, an outsider or nobody', async () => {
    const { number } = await aCase();
    for (const personId of [people.manager.person.id, people.outsider.person.id, people.laboratory.id]) {
      const answered = await people.manager.client.put(`/cases/${number}/holder`, { personId, versionSeen: 1 });
      expect(answered.body).toMatchObject({ code: 'not-valid', field: 'personId' });
    }
  });

  it('lets nobody but an analyst of the laboratory open or change a case', async () => {
    const { number } = await aCase();
    for (const { client } of [people.engineer, people.manager, people.administrator, people.requester]) {
      expect((await client.post('/cases', caseFacts(people))).body.code).toBe('not-allowed');
      expect((await client.patch(`/cases/${number}`, { title: 'x', versionSeen: 1 })).status).not.toBe(200);
    }
  });

  it('makes no author of who only opens, changes and moves a case', async () => {
    const { number } = await aCase();
    await people.analyst.client.post(`/cases/${number}/moves`, { to: 'examining', versionSeen: 1 });
    expect((await people.analyst.client.get(`/cases/${number}`)).body.authorIds).toEqual([]);
  });
});

describe('two people who change a case at once', () => {
  it('leaves one change standing and shows the other writer what stands now', async () => {
    const { number } = await aCase();
    const change = (who: typeof people.analyst, title: string) =>
      who.client.patch(`/cases/${number}`, { title, versionSeen: 1 });
    const answers = await Promise.all([change(people.analyst, 'Mine'), change(people.secondAnalyst, 'Theirs')]);
    const kept = answers.find(({ status }) => status === 200);
    const refused = answers.find(({ status }) => status === 409);
    expect(refused?.body).toMatchObject({
      code: 'stale-version',
      current: { title: kept?.body.title, version: 2 },
    });
  });
});

describe('what was asked', () => {
  it('keeps every agreed version and says why it was changed', async () => {
    const { number } = await aCase();
    const agreed = {
      questions: [{ key: 'q1', text: 'Do the other posts hold the same flaw?' }],
      besideScope: 'leave to keep posts in use',
      versionSeen: 1,
    };
    const silent = await people.analyst.client.post(`/cases/${number}/questions`, { ...agreed, reason: '' });
    expect(silent.body.field).toBe('reason');
    const { body } = await people.analyst.client.post(`/cases/${number}/questions`, {
      ...agreed,
      reason: 'we can look for the flaw, not give leave for use',
    });
    expect(body.map(({ version }: { version: number }) => version)).toEqual([2, 1]);
    expect(body[1].questions[0].text).toBe('Are the others safe?');
  });

  it('shows what was agreed meanwhile to who writes from an older version', async () => {
    const { number } = await aCase();
    const stale = { questions: [], besideScope: '', reason: 'shorter', versionSeen: 0 };
    const { body } = await people.analyst.client.post(`/cases/${number}/questions`, stale);
    expect(body).toMatchObject({ code: 'stale-version', current: { version: 1 } });
  });
});

describe('the background of a case', () => {
  const told = { statement: 'The crate was not dropped.', standing: 'told', source: 'carrier', givenOn: '2026-06-19' };

  it('stands as known, told or assumed, each with source and day, known first', async () => {
    const { number } = await aCase();
    const path = `/cases/${number}/background`;
    await people.analyst.client.post(path, told);
    const { body } = await people.analyst.client.post(path, { ...told, standing: 'known', source: 'photograph E3' });
    expect(body.map(({ standing }: { standing: string }) => standing)).toEqual(['known', 'told']);
    expect((await people.analyst.client.post(path, { ...told, source: ' ' })).body.field).toBe('source');
  });

  it('is changed from the version seen, and taken back with a reason', async () => {
    const { number } = await aCase();
    const path = `/cases/${number}/background`;
    const [{ id }] = (await people.analyst.client.post(path, told)).body;
    const change = { ...told, standing: 'known', versionSeen: 1 };
    expect((await people.analyst.client.put(`${path}/${id}`, change)).body[0].standing).toBe('known');
    expect((await people.secondAnalyst.client.put(`${path}/${id}`, change)).body.current.version).toBe(2);
    const takenBack = await people.analyst.client.delete(`${path}/${id}`, { versionSeen: 2, reason: 'said in error' });
    expect(takenBack.body).toEqual([]);
    const { body } = await people.analyst.client.get(`/cases/${number}/history`);
    expect(body.entries[0]).toMatchObject({ reason: 'said in error', personName: 'Ana Lyst' });
  });
});
