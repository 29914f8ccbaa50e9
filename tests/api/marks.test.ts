import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { uuidv7 } from 'uuidv7';
import { sql } from 'drizzle-orm';
import { readMeasurement } from '#server/features/marks/service/read-measurement.ts';
import { listSources } from '#server/lineage/lineage.ts';
import { openCase } from '#server/rights/open-case.ts';
import { aCalibration, aCase, aFractograph, rebind } from '../support/a-bar-case.ts';
import { aReadyImage, anImage } from '../support/an-image.ts';
import { closeByHand } from '../support/close-by-hand.ts';
import { aLaboratory, startTestServer, type Admitted, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let calibrationId: string;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
  calibrationId = await aCalibration(people, 0.5);
});
afterAll(() => server.stop());

/** A case with one image of 3000 × 2000 px, and the path of its marks. */
async function aBench() {
  const { id, number } = await aCase(people);
  const image = await aFractograph(people, id, 1, calibrationId);
  return { id, number, image, path: `/cases/${number}/fractographs/${image.id}/marks` };
}

const said = { certainty: 'certain', boundary: null, originCode: null, note: '' };
const anOrigin = (x = 1500, y = 1500) => ({
  ...said,
  kind: 'origin',
  originCode: 'P',
  geometry: { shape: 'point', at: { x, y } },
});
const aLine = (kind: 'hackle' | 'length', to: { x: number; y: number }) => ({
  ...said,
  kind,
  geometry: { shape: 'segment', from: { x: 100, y: 100 }, to },
});
const aMirror = {
  ...said,
  kind: 'mirror',
  boundary: 'outer',
  geometry: {
    shape: 'chain',
    points: [
      { x: 1000, y: 1500 },
      { x: 1500, y: 1000 },
      { x: 2000, y: 1500 },
    ],
  },
};

async function drawn(person: Admitted, path: string, mark: unknown) {
  const { status, body } = await person.client.post(path, mark);
  expect(status, JSON.stringify(body)).toBe(201);
  return body;
}

describe('marks of a case', () => {
  it('are numbered m1, m2 through the case, and read back with the coordinates they were drawn at', async () => {
    const { number, path } = await aBench();
    const first = await drawn(people.analyst, path, anOrigin(1500.25, 1499.75));
    const second = await drawn(people.secondAnalyst, path, aLine('hackle', { x: 300, y: 40 }));
    expect([first.number, second.number]).toEqual([1, 2]);
    const { body } = await people.manager.client.get(`/cases/${number}/marks`);
    expect(body.map((mark: { geometry: unknown }) => mark.geometry)).toEqual([first.geometry, second.geometry]);
    expect(body[0].geometry.at).toEqual({ x: 1500.25, y: 1499.75 });
  });

  it('are drawn once, however often the same mark is sent', async () => {
    const { path } = await aBench();
    const mark = { ...anOrigin(), id: uuidv7() };
    const answers = await Promise.all([1, 2, 3].map(() => people.analyst.client.post(path, mark)));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect((await people.analyst.client.get(path)).body).toHaveLength(1);
  });

  it.each([
    [
      'of another shape than its kind',
      { ...anOrigin(), geometry: { shape: 'segment', from: { x: 1, y: 1 }, to: { x: 2, y: 2 } } },
    ],
    ['beside the image', anOrigin(3001, 10)],
    ['of no length', aLine('length', { x: 100, y: 100 })],
  ])('are refused %s, naming the field', async (_what, mark) => {
    const { path } = await aBench();
    const { status, body } = await people.analyst.client.post(path, mark);
    expect([status, body.code, body.field]).toEqual([422, 'not-valid', 'geometry']);
  });

  it('are drawn by analysts only, and are not there for others than the laboratory', async () => {
    const { path } = await aBench();
    expect((await people.engineer.client.post(path, anOrigin())).body.code).toBe('not-allowed');
    expect((await people.manager.client.post(path, anOrigin())).body.code).toBe('not-allowed');
    expect((await people.requester.client.get(path)).status).toBe(403);
    expect((await people.outsider.client.get(path)).status).toBe(404);
    expect((await people.outsider.client.post(path, anOrigin())).status).toBe(404);
  });

  it('take no change once the case is closed, by the database itself too', async () => {
    const { id, path } = await aBench();
    const mark = await drawn(people.analyst, path, anOrigin());
    await closeByHand(server, id);
    const moved = await people.analyst.client.patch(`${path}/${mark.id}`, { versionSeen: 1, certainty: 'possible' });
    expect(moved.body.code).toBe('closed-case');
    const behind = server.parts.database.db.execute(
      sql`insert into marks (id, case_id, fractograph_id, number, kind)
          select ${uuidv7()}::uuid, case_id, fractograph_id, 99, kind from marks where id = ${mark.id}::uuid`,
    );
    await expect(behind).rejects.toMatchObject({ cause: { code: 'HB001' } });
  });
});

describe('versions of a mark', () => {
  it('keep every state it had, who made it, and what was taken off', async () => {
    const { path } = await aBench();
    const { id } = await drawn(people.analyst, path, anOrigin());
    const at = `${path}/${id}`;
    await people.secondAnalyst.client.patch(at, { versionSeen: 1, certainty: 'likely' });
    await people.analyst.client.patch(at, { versionSeen: 2, geometry: { shape: 'point', at: { x: 7, y: 8 } } });
    await people.analyst.client.delete(at, { versionSeen: 3 });
    const back = await people.secondAnalyst.client.post(`${at}/restore`, { versionSeen: 4 });
    expect(back.body).toMatchObject({
      version: 5,
      removed: false,
      certainty: 'likely',
      geometry: { at: { x: 7, y: 8 } },
    });
    const { body } = await people.manager.client.get(`${at}/versions`);
    expect(body.map((version: { version: number; removed: boolean }) => [version.version, version.removed])).toEqual([
      [5, false],
      [4, true],
      [3, false],
      [2, false],
      [1, false],
    ]);
    expect(body[4]).toMatchObject({ certainty: 'certain', madeBy: { name: 'Ana Lyst' } });
    const behind = server.parts.database.db.execute(
      sql`update mark_versions set note = 'x' where mark_id = ${id}::uuid`,
    );
    await expect(behind).rejects.toMatchObject({ cause: { code: 'HB002' } });
  });

  it('refuse a change made from an older one, and show the newer', async () => {
    const { path } = await aBench();
    const { id } = await drawn(people.analyst, path, anOrigin());
    await people.secondAnalyst.client.patch(`${path}/${id}`, { versionSeen: 1, note: 'a pore' });
    const late = await people.analyst.client.patch(`${path}/${id}`, { versionSeen: 1, note: 'an agglomerate' });
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({ code: 'stale-version', current: { version: 2, note: 'a pore' } });
  });

  it('loses none of 200 edits of two people at once', async () => {
    const { number, path } = await aBench();
    const one = await drawn(people.analyst, path, anOrigin());
    const edit = async (person: Admitted, count: number) => {
      const at = `${path}/${one.id}`;
      for (let made = 0; made < count;) {
        const seen = (await person.client.get(path)).body.find((mark: { id: string }) => mark.id === one.id);
        const geometry = { shape: 'point', at: { x: seen.geometry.at.x + 1, y: 1500 } };
        const answer = await person.client.patch(at, { versionSeen: seen.version, geometry });
        if (answer.status === 200) made += 1;
        else expect(answer.body.code).toBe('stale-version');
      }
    };
    const draw = async (person: Admitted, count: number) => {
      for (let made = 0; made < count; made += 1) await drawn(person, path, aLine('hackle', { x: 200, y: 100 + made }));
    };
    await Promise.all([
      edit(people.analyst, 30),
      edit(people.secondAnalyst, 30),
      draw(people.analyst, 70),
      draw(people.secondAnalyst, 70),
    ]);
    const marks: { id: string; number: number; version: number; geometry: { at: { x: number } } }[] = (
      await people.manager.client.get(`/cases/${number}/marks`)
    ).body;
    expect(marks.map((mark) => mark.number)).toEqual(Array.from({ length: 141 }, (_, index) => index + 1));
    // each edit added one to the x it had seen: none overwrote another
    expect(marks[0]).toMatchObject({ version: 61, geometry: { at: { x: 1560 } } });
  }, 120_000);
});

describe('lengths read from marks', () => {
  it('are offered with their uncertainty where the image has a scale', async () => {
    const { number, path } = await aBench();
    await drawn(people.analyst, path, anOrigin());
    await drawn(people.analyst, path, aMirror);
    const { body } = await people.manager.client.get(`/cases/${number}/measurements`);
    expect(body).toHaveLength(1);
    // three directions of 500 px at 0.5 µm; both ends 0.408 px and 0.25 % of the scale: u = 0.656 µm
    expect(body[0]).toMatchObject({ quantity: 'mirror radius', boundary: 'outer', markNumber: 2, figureNumber: 1 });
    expect(body[0].valueMm).toBeCloseTo(0.25, 9);
    expect(body[0].standardUncertaintyMm).toBeCloseTo(Math.hypot(0.5 * 0.40825, 0.0025 * 250) / 1000, 7);
  });

  it('name their sources, and turn stale when mark, origin or scale is another, not when only a note is', async () => {
    const { number, image, path } = await aBench();
    const origin = await drawn(people.analyst, path, anOrigin());
    const mirror = await drawn(people.analyst, path, aMirror);
    const heldCase = await openCase(people.analyst.context, number, 'estimate');
    const read = () =>
      people.analyst.context.inTransaction((tx) =>
        readMeasurement(tx, people.analyst.context, heldCase, { markId: mirror.id, quantity: 'mirror radius' }),
      );
    const first = await read();
    expect((await read()).id).toBe(first.id);
    const sources = await listSources(people.analyst.context.reader, { kind: 'measurement', id: first.id });
    expect(new Set(sources.map(({ kind }) => kind))).toEqual(
      new Set(['mark version', 'calibration binding', 'fractograph', 'calibration']),
    );
    expect(sources.map((source) => source.id)).toEqual(expect.arrayContaining([mirror.versionId, origin.versionId]));
    const whys = async (recordId: string) => {
      const { rows } = await server.parts.database.db.execute<{ why: string }>(
        sql`select why from staleness where record_id = ${recordId}::uuid order by since, why`,
      );
      return rows.map(({ why }) => why);
    };
    await people.analyst.client.patch(`${path}/${mirror.id}`, { versionSeen: 1, note: 'clear', certainty: 'likely' });
    expect(await whys(first.id)).toEqual([]);
    await people.analyst.client.patch(`${path}/${origin.id}`, {
      versionSeen: 1,
      geometry: { shape: 'point', at: { x: 1510, y: 1500 } },
    });
    expect(await whys(first.id)).toEqual(['mark m1 was moved by Ana Lyst']);
    const second = await read();
    expect(second.id).not.toBe(first.id);
    await rebind(people, number, image, await aCalibration(people, 0.6));
    expect(await whys(second.id)).toEqual([expect.stringMatching(/^Fig. 1 was bound to CAL-02 .* in place of CAL-01/)]);
    expect((await read()).valueMm / second.valueMm).toBeCloseTo(1.2, 9);
  });

  it('are px only, and no input of anything, while the image is uncalibrated', async () => {
    const { number } = await aCase(people);
    const image = await aReadyImage(people.analyst, number, await anImage('png'));
    const path = `/cases/${number}/fractographs/${image.id}/marks`;
    const mark = await drawn(people.analyst, path, aLine('length', { x: 400, y: 100 }));
    const { body } = await people.analyst.client.get(`/cases/${number}/measurements`);
    expect(body).toMatchObject([{ valuePx: 300, valueMm: null, standardUncertaintyMm: null }]);
    const heldCase = await openCase(people.analyst.context, number, 'estimate');
    const read = people.analyst.context.inTransaction((tx) =>
      readMeasurement(tx, people.analyst.context, heldCase, { markId: mark.id, quantity: 'length' }),
    );
    await expect(read).rejects.toMatchObject({ code: 'not-ready', message: expect.stringContaining('uncalibrated') });
  });
});
