import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sql } from 'drizzle-orm';
import { listCasebook } from '#server/features/cases/service/list-casebook.ts';
import { CasebookQuery } from '#shared/contracts/casebook.ts';
import { seesCase } from '#shared/rules/may.ts';
import { anOrigin } from '../support/an-origin.ts';
import { openedCase, restrict } from '../support/cases-at-hand.ts';
import { aLaboratory, startTestServer, type Admitted, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let numbers: string[];
let materialId: string;

/** Five cases: 1 of the outside firm, 2 restricted to the second analyst, 3 held by the analyst, 4 with an origin, 5 new. */
beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
  const entered = { name: 'alumina AL-PB', family: 'alumina', route: null, grainSizeUm: null, note: null };
  materialId = (await people.engineer.client.post('/materials', entered)).body.id;
  const cases = [];
  for (const more of [
    { title: 'Seal ring, chipped', organisationId: people.outside.id },
    { title: 'Bar B-22', summary: 'weak' },
    { title: 'Sight glass, scratched', materialId },
    { title: 'Bar A-17, broke in test' },
    { title: 'Post, porcelain' },
  ])
    cases.push(await openedCase(people, more));
  numbers = cases.map(({ number }) => number);
  await restrict(people, numbers[1], [people.secondAnalyst.person.id]);
  await people.analyst.client.post(`/cases/${numbers[2]}/taken`, { versionSeen: 1 });
  await people.analyst.client.put(`/cases/${numbers[4]}/hold`, {
    ...{ reason: 'waits', until: '2099-01-01', versionSeen: 1 },
  });
  await anOrigin(people.analyst, { caseId: cases[3].id, originCode: 'P', at: { x: 640, y: 410 } });
});
afterAll(() => server.stop());

const seenBy = async (who: Admitted, query = '') => {
  const { body } = await who.client.get(`/cases?${query}`);
  return body.rows.map((row: { number: string }) => numbers.indexOf(row.number) + 1);
};

describe('the Casebook', () => {
  it('lists the cases of this year, newest first, without those behind a wall', async () => {
    expect(await seenBy(people.analyst)).toEqual([5, 4, 3, 1]);
    expect(await seenBy(people.secondAnalyst)).toEqual([5, 4, 3, 2, 1]);
    expect(await seenBy(people.analyst, 'year=2019')).toEqual([]);
  });

  it('shows an organisation its own cases alone, in plain words', async () => {
    const { body } = await people.requester.client.get('/cases');
    expect(body.total).toBe(4);
    expect(Object.keys(body.rows[0]).toSorted()).toEqual(
      ['number', 'plainState', 'receivedAt', 'seenAs', 'stateSince', 'title'].toSorted(),
    );
    expect(await seenBy(people.makerEngineer)).toEqual([5, 4, 3, 2]);
    expect(await seenBy(people.outsider)).toEqual([1]);
  });

  it('tells an administrator numbers and states, and no title', async () => {
    const { body } = await people.administrator.client.get('/cases');
    expect(body.total).toBe(5);
    expect(Object.keys(body.rows[0]).toSorted()).toEqual(['holdUntil', 'number', 'seenAs', 'state']);
  });

  it('finds by every word, each as the beginning of one, and by the digits of a number', async () => {
    expect(await seenBy(people.analyst, 'words=BAR')).toEqual([4]);
    expect(await seenBy(people.analyst, 'words=bar+a-1')).toEqual([4]);
    expect(await seenBy(people.analyst, 'words=0003')).toEqual([3]);
    expect(await seenBy(people.analyst, `words=${numbers[0]}`)).toEqual([1]);
    expect(await seenBy(people.analyst, 'words=bar+glass')).toEqual([]);
  });

  it('lets nobody search in what they may not read', async () => {
    expect(await seenBy(people.secondAnalyst, 'words=weak')).toEqual([2]);
    expect(await seenBy(people.requester, 'words=weak')).toEqual([]);
    expect(await seenBy(people.administrator, 'words=bar')).toEqual([]);
    expect(await seenBy(people.requester, `held=${people.analyst.person.id}`)).toEqual([5, 4, 3, 2]);
  });

  it('filters by state, holder, material, origin and hold', async () => {
    expect(await seenBy(people.analyst, 'state=on+hold')).toEqual([5]);
    expect(await seenBy(people.analyst, 'held=me')).toEqual([3]);
    expect(await seenBy(people.secondAnalyst, 'held=me')).toEqual([]);
    expect(await seenBy(people.analyst, 'held=no+one')).toEqual([5, 4, 1]);
    expect(await seenBy(people.analyst, `material=${materialId}`)).toEqual([3]);
    expect(await seenBy(people.analyst, 'origin=P')).toEqual([4]);
    expect(await seenBy(people.analyst, 'origin=A')).toEqual([]);
    expect(await seenBy(people.analyst, 'state=closed')).toEqual([]);
  });

  it('carries the origin and where it lies on its figure', async () => {
    const { body } = await people.analyst.client.get('/cases?origin=P');
    expect(body.rows[0]).toMatchObject({ originCode: 'P', hasFractographs: true, picture: { x: 640, y: 410 } });
  });

  it('is ordered by title, age and material in both directions', async () => {
    expect(await seenBy(people.analyst, 'order=title&direction=ascending')).toEqual([4, 5, 1, 3]);
    expect(await seenBy(people.analyst, 'order=age&direction=descending')).toEqual([1, 3, 4, 5]);
    expect((await seenBy(people.analyst, 'order=material&direction=ascending'))[0]).toBe(3);
    expect(await seenBy(people.analyst, 'order=number&direction=ascending')).toEqual([1, 3, 4, 5]);
  });

  it('refuses a page of another size, and has nothing past its last', async () => {
    expect((await people.analyst.client.get('/cases?size=500')).body.code).toBe('not-valid');
    expect(await seenBy(people.analyst, 'page=2')).toEqual([]);
  });

  it('counts behind its tabs what its rows would show, for each who asks', async () => {
    const { body } = await people.analyst.client.get('/casebook/counts');
    expect(body).toMatchObject({ thisYear: 4, all: 4, open: 4, withMe: 1, toSign: 0, stale: 0, inReview: 0 });
    expect((await people.outsider.client.get('/casebook/counts')).body).toMatchObject({ all: 1, withMe: 0 });
  });

  it('lists what is stale with the reason, until it is settled', async () => {
    await server.parts.database.db.execute(sql`
      insert into staleness (record_kind, record_id, cause_kind, cause_id, case_id, why, since)
      select 'estimate', gen_random_uuid(), 'calibration', gen_random_uuid(), id, 'CAL-06 was replaced', now()
      from cases where number = ${numbers[0]}`);
    const { body } = await people.analyst.client.get('/cases?stale=1');
    expect(body.rows).toMatchObject([{ number: numbers[0], stale: { why: 'CAL-06 was replaced' } }]);
    expect((await people.outsider.client.get('/cases')).body.rows[0]).not.toHaveProperty('stale');
  });

  it('puts in review before whoever may sign, and not before who wrote it', async () => {
    await server.parts.database.db.execute(sql`update cases set state = 'in review' where number = ${numbers[3]}`);
    expect(await seenBy(people.manager, 'sign=1')).toEqual([4]);
    await server.parts.database.db.execute(sql`
      insert into case_authors (case_id, person_id, first_act, at)
      select id, ${people.manager.person.id}::uuid, 'mark.drawn', now() from cases where number = ${numbers[3]}`);
    expect(await seenBy(people.manager, 'sign=1')).toEqual([]);
  });
});

describe('the wall of the Casebook', () => {
  it('is the wall of the case itself, for everyone', async () => {
    const facts = await server.parts.database.db.execute<{
      number: string;
      organisation_id: string;
      restricted: boolean;
    }>(sql`select number, organisation_id, restricted from cases`);
    const query = CasebookQuery.parse({ size: 50, year: 'any' });
    const { analyst, secondAnalyst, engineer, manager, makerEngineer, requester, outsider } = people;
    for (const { context, person } of [
      ...[analyst, secondAnalyst, engineer, manager],
      ...[makerEngineer, requester, outsider],
    ]) {
      const listed = (await listCasebook(context, query)).rows.map(({ number }) => String(number));
      const seen = facts.rows.filter(({ number, organisation_id: organisationId, restricted }) =>
        seesCase(person, {
          ...{ organisationId, restricted, state: 'received', onHold: false, assignedTo: null, authorIds: [] },
          namedPersonIds: number === numbers[1] ? [secondAnalyst.person.id, manager.person.id] : [],
        }),
      );
      expect(listed.toSorted()).toEqual(seen.map(({ number }) => number).toSorted());
    }
  });
});
