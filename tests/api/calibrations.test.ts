import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { staleness } from '#server/database/tables/acts.ts';
import { recordLineage } from '#server/lineage/lineage.ts';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import { aCase } from '../support/a-bar-case.ts';
import { aReadyImage, anImage } from '../support/an-image.ts';
import { closeByHand } from '../support/close-by-hand.ts';
import { aLaboratory, startTestServer, type Admitted, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let instrumentId: string;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
  const made = await people.administrator.client.post('/laboratory/instruments', {
    name: 'Compound microscope',
    kind: 'compound',
  });
  instrumentId = made.body.id;
});
afterAll(() => server.stop());

const aGraticule = (pixelSizeXUm: number, setting = '20×') => ({
  setting,
  way: 'graticule',
  pixelSizeXUm,
  expandedUncertaintyPercent: 0.5,
  source: 'stage micrometer SM-2, certificate of May',
  validFrom: '2026-02-11',
});

/** A calibration kept for the microscope. @returns its id and code */
async function keep(pixelSizeXUm: number, setting?: string): Promise<{ id: string; code: string }> {
  const asked = { instrumentId, ...aGraticule(pixelSizeXUm, setting) };
  const { status, body } = await people.administrator.client.post('/laboratory/calibrations', asked);
  expect(status).toBe(201);
  return body;
}

async function anImageOf(pixelsPerMm?: number): Promise<{ caseId: string; at: string; image: FractographView }> {
  const { id, number } = await aCase(people);
  const bytes = await anImage('tiff', { widthPx: 90, heightPx: 60 }, { pixelsPerMm });
  const image = await aReadyImage(people.analyst, number, bytes);
  return { caseId: id, at: `/cases/${number}/fractographs/${image.id}`, image };
}

const typed = (pixelSizeXUm: number, more: Record<string, unknown> = {}) => ({
  way: 'typed',
  pixelSizeXUm,
  relativeUncertainty: 0.01,
  source: 'sheet of the electron microscope',
  typed: `${pixelSizeXUm} µm`,
  ...more,
});

const bar = (lengths: number[], barLengthUm = 200) => ({
  way: 'burned bar',
  readings: lengths.map((length) => ({ from: { x: 10, y: 50 }, to: { x: 10 + length, y: 50 } })),
  barLengthUm,
  barStandardUncertaintyUm: 1,
  typed: `${barLengthUm} µm`,
});

function bind(person: Admitted, at: string, reading: unknown, more: Record<string, unknown> = {}) {
  return person.client.post(`${at}/calibrations`, { reading, bindingSeen: null, ...more });
}

/** A length as a later part would record it: something made from the binding. */
async function somethingReadWith(bindingId: string): Promise<string> {
  const id = crypto.randomUUID();
  await people.analyst.context.inTransaction((tx) =>
    recordLineage(tx, { kind: 'measurement', id }, [{ kind: 'calibration binding', id: bindingId }]),
  );
  return id;
}

async function staleReasons(recordId: string): Promise<string[]> {
  const rows = await server.parts.database.db.select().from(staleness).where(eq(staleness.recordId, recordId));
  return rows.map((row) => row.why);
}

describe('an image', () => {
  it('has no scale until one is bound', async () => {
    const { image } = await anImageOf();
    expect(image.scale).toBeNull();
  });

  it('takes a typed size, x and y apart', async () => {
    const { at } = await anImageOf();
    const { status, body } = await bind(people.analyst, at, typed(0.5, { pixelSizeYUm: 0.577 }));
    expect(status).toBe(201);
    expect(body.scale).toMatchObject({ way: 'typed', pixelSizeXUm: 0.5, pixelSizeYUm: 0.577, code: null });
  });

  it('takes a burned bar read twice, and keeps its spread', async () => {
    const { at } = await anImageOf();
    const { body } = await bind(people.analyst, at, bar([40, 40.4]));
    expect(body.scale.pixelSizeXUm).toBeCloseTo(200 / 40.2, 9);
    expect(body.scale.relativeUncertainty).toBeGreaterThan(0.005);
    expect(body.scale.source).toBe('bar of 200 µm read twice, 1.0 % apart');
  });

  it('does not take a bar read once', async () => {
    const { at } = await anImageOf();
    const { status, body } = await bind(people.analyst, at, bar([40]));
    expect([status, body.field]).toEqual([422, 'reading.readings']);
  });

  it('takes the size of its own file once a person confirmed it', async () => {
    const { at, image } = await anImageOf(2560);
    const reading = { way: 'file tags', pixelSizeUm: image.tagPixelSizeUm, relativeUncertainty: 0.02 };
    const { body } = await bind(people.analyst, at, reading);
    expect(body.scale).toMatchObject({ way: 'file tags', pixelSizeXUm: 0.390625 });
    expect(body.scale.source).toMatch(/^TIFF resolution .* px\/cm, confirmed by Ana Lyst$/);
  });

  it('takes a calibration the laboratory keeps', async () => {
    const { at } = await anImageOf();
    const { id, code } = await keep(1.1);
    const { body } = await bind(people.analyst, at, { way: 'kept calibration', calibrationId: id });
    expect(body.scale).toMatchObject({ code, pixelSizeXUm: 1.1, relativeUncertainty: 0.0025 });
  });

  it('is not bound by a manager, and is not there for an outsider', async () => {
    const { at } = await anImageOf();
    expect((await bind(people.manager, at, typed(0.5))).status).toBe(403);
    expect((await bind(people.outsider, at, typed(0.5))).status).toBe(404);
  });
});

describe('ways to one scale that disagree', () => {
  it('ask before binding, and bind only with a reason', async () => {
    const { at } = await anImageOf(2560);
    const asked = await bind(people.analyst, at, typed(0.78));
    expect([asked.status, asked.body.code, asked.body.field]).toEqual([409, 'not-ready', 'confirm']);
    expect(asked.body.message).toMatch(/nearly twice that/);
    const noReason = await bind(people.analyst, at, typed(0.78), { confirmed: true });
    expect([noReason.status, noReason.body.field]).toEqual([422, 'reason']);
    const reason = 'The image was made smaller by half on export.';
    const bound = await bind(people.analyst, at, typed(0.78), { confirmed: true, reason });
    expect(bound.status).toBe(201);
  });

  it('are found against what the laboratory keeps for the same objective', async () => {
    const { at, image } = await anImageOf();
    const { code } = await keep(0.33, '60×');
    const said = { instrumentId, objective: '60x', versionSeen: image.version };
    await people.analyst.client.patch(at, said);
    const { body } = await bind(people.analyst, at, typed(0.35));
    expect(body.message).toContain(`${code} of the same objective`);
  });

  it('are two readings of one bar more than 3 % apart, too', async () => {
    const { at } = await anImageOf();
    const asked = await bind(people.analyst, at, bar([40, 42]));
    expect([asked.body.code, asked.body.field]).toEqual(['not-ready', 'confirm']);
    expect((await bind(people.analyst, at, bar([40, 41]))).status).toBe(201);
  });
});

describe('an image bound anew', () => {
  it('keeps the earlier binding and makes what was read with it stale', async () => {
    const { at } = await anImageOf();
    const first = (await bind(people.analyst, at, typed(2.2))).body.scale;
    const lengthId = await somethingReadWith(first.bindingId);
    const noReason = await bind(people.analyst, at, typed(1.1), { bindingSeen: first.bindingId });
    expect([noReason.status, noReason.body.field]).toEqual([422, 'reason']);
    const again = { bindingSeen: first.bindingId, reason: 'It was taken at 10×, not 5×.' };
    const second = (await bind(people.secondAnalyst, at, typed(1.1), again)).body.scale;
    expect(second.pixelSizeXUm).toBe(1.1);
    expect(await staleReasons(lengthId)).toEqual([expect.stringMatching(/1\.1 µm\/px.* in place of .*2\.2 µm\/px/)]);
    expect(await staleReasons(second.bindingId)).toEqual([]);
    const history = (await people.manager.client.get(`${at}/calibrations`)).body;
    expect(history.map((each: { inForce: boolean }) => each.inForce)).toEqual([true, false]);
    expect(history[1].boundBy.name).toBe('Ana Lyst');
  });

  it('by two at once is bound by one of them; the other sees it', async () => {
    const { at } = await anImageOf();
    const answers = await Promise.all([
      bind(people.analyst, at, typed(0.5)),
      bind(people.secondAnalyst, at, typed(0.6)),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    const late = answers.find(({ status }) => status === 409);
    expect(late?.body.code).toBe('stale-version');
    expect(late?.body.current.scale).not.toBeNull();
  });
});

describe('a kept calibration that is replaced', () => {
  it('makes bindings and lengths of closed cases stale, and touches nothing sealed', async () => {
    const old = await keep(0.55);
    const open = await anImageOf();
    const closed = await anImageOf();
    const reading = { way: 'kept calibration', calibrationId: old.id };
    const inOpen = (await bind(people.analyst, open.at, reading)).body.scale;
    const inClosed = (await bind(people.analyst, closed.at, reading)).body.scale;
    const lengthId = await somethingReadWith(inClosed.bindingId);
    await closeByHand(server, closed.caseId);

    const reach = await people.administrator.client.get(`/laboratory/calibrations/${old.id}/reach`);
    expect(reach.body).toMatchObject({ bindings: 2, lengths: 1, otherCases: 0 });
    expect(reach.body.cases.map((each: { state: string }) => each.state).sort()).toEqual(['closed', 'received']);

    const replacement = { ...aGraticule(0.5599), asFoundErrorPercent: 1.8, reason: 'Reference scale found 1.8 % out.' };
    const made = await people.administrator.client.post(`/laboratory/calibrations/${old.id}/replacement`, replacement);
    expect(made.status).toBe(201);
    for (const id of [inOpen.bindingId, inClosed.bindingId, lengthId])
      expect(await staleReasons(id)).toEqual([expect.stringMatching(/0\.55 µm\/px.*was replaced by.*1\.8 % out/)]);
    const sealed = (await people.analyst.client.get(closed.at)).body;
    expect(sealed.scale).toMatchObject({ bindingId: inClosed.bindingId, pixelSizeXUm: 0.55 });
    expect(sealed.scale.stale.why).toContain('1.8 % out');
    const list = (await people.manager.client.get('/laboratory/calibrations')).body;
    const shown = list.find((each: { id: string }) => each.id === old.id);
    expect(shown.replacedBy.code).toBe(made.body.code);
  });

  it('is bound to no further image, and is not replaced twice', async () => {
    const old = await keep(0.7);
    const replacement = { ...aGraticule(0.71), reason: 'Found out at the yearly check.' };
    const path = `/laboratory/calibrations/${old.id}/replacement`;
    const both = await Promise.all([
      people.administrator.client.post(path, replacement),
      people.analyst.client.post(path, replacement),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    const { at } = await anImageOf();
    const { status, body } = await bind(people.analyst, at, { way: 'kept calibration', calibrationId: old.id });
    expect([status, body.code]).toEqual([409, 'wrong-state']);
  });

  it('is neither read nor recorded by people of other organisations', async () => {
    for (const person of [people.makerEngineer, people.requester, people.outsider]) {
      expect((await person.client.get('/laboratory/calibrations')).status).toBe(403);
      const asked = { instrumentId, ...aGraticule(1) };
      expect((await person.client.post('/laboratory/calibrations', asked)).status).toBe(403);
    }
    expect((await people.manager.client.post('/laboratory/instruments', { name: 'X2', kind: 'stereo' })).status).toBe(
      403,
    );
  });
});
