import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sql } from 'drizzle-orm';
import { recomputeEstimate } from '#server/features/estimates/service/recompute-estimate.ts';
import { estimates } from '#server/database/tables/estimates.ts';
import { EstimatesView, EstimateView, RecomputedView } from '#shared/contracts/estimates.ts';
import {
  aCalibration,
  aCase,
  aConstant,
  aFractograph,
  aLoadEstimate,
  aMaterial,
  markFace,
} from '../support/a-bar-case.ts';
import { closeByHand } from '../support/close-by-hand.ts';
import { stressesWithoutInterval } from '../support/stresses-without-interval.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

/** Case 0001 of the demonstration: mirror 1018 px and flaw 116.4 px of 0.5500 µm. */
async function aMarkedCase(boundary?: string) {
  const { id, number } = await aCase(people);
  const calibrationId = await aCalibration(people, 0.55);
  const image = await aFractograph(people, id, 1, calibrationId);
  const marks = await markFace(
    people.analyst,
    { number, imageId: image.id },
    { radiusPx: 1018, flawPx: 116.4, boundary },
  );
  const materialId = await aMaterial(people);
  const toughness = await aConstant(people, { materialId, kind: 'toughness', value: 3.5, expanded: 0.2 });
  const kind = 'mirror constant, outer' as const;
  const mirrorConstant = await aConstant(people, { materialId, kind, value: 8.5, expanded: 0.6 });
  return { id, number, image, marks, toughness, mirrorConstant, path: `/cases/${number}/estimates` };
}

type Marked = Awaited<ReturnType<typeof aMarkedCase>>;

const mirrorEstimate = ({ marks, mirrorConstant }: Marked) => ({
  method: 'mirror.stress',
  inputs: {
    A: { from: 'constant', constantId: mirrorConstant },
    R: { from: 'mark', markId: marks.mirror, quantity: 'mirror radius', relativeUncertaintyPercent: 6 },
  },
});

const flawEstimate = ({ marks, toughness }: Marked) => ({
  method: 'flaw.stress',
  inputs: {
    KIc: { from: 'constant', constantId: toughness },
    Y: { from: 'typed', text: '1.29', uncertaintyText: '6 %', note: 'half-round at the surface' },
    c: { from: 'mark', markId: marks.flaw, quantity: 'flaw half-axis, depth', relativeUncertaintyPercent: 10 },
  },
});

async function made(path: string, wanted: unknown) {
  const { status, body } = await people.analyst.client.post(path, wanted);
  expect(body).toMatchObject({ number: expect.any(Number) });
  expect(status).toBe(201);
  return EstimateView.parse(body);
}

const refusedOf = async (path: string, wanted: unknown) => (await people.analyst.client.post(path, wanted)).body;

/** Printed to one decimal in the hand values: half a unit of the last place. */
function expectStress(view: EstimateView, [value, expanded]: readonly [number, number]) {
  expect(Math.abs(view.origin.value - value)).toBeLessThanOrEqual(0.05);
  expect(Math.abs(view.origin.expandedUncertainty - expanded)).toBeLessThanOrEqual(0.1);
}

describe('an estimate of the stress at the origin', () => {
  it('equals the hand values of bar A-17 by load, mirror and flaw', async () => {
    const marked = await aMarkedCase();
    expectStress(await made(marked.path, aLoadEstimate()), [350.0, 14.0]);
    expectStress(await made(marked.path, mirrorEstimate(marked)), [359.2, 33.3]);
    expectStress(await made(marked.path, flawEstimate(marked)), [339.1, 56.4]);
    const { body } = await people.analyst.client.get(marked.path);
    const { agreement, estimates: views } = EstimatesView.parse(body);
    expect(agreement.verdict).toBe('agree');
    expect(agreement.words).toContain('two lines, one scale');
    expect(views.map((view) => view.isCompared)).toEqual([true, true, true]);
  });

  it('gives the stress on the tensile face and that at a deep origin under two names, each with its interval', async () => {
    const { path } = await aMarkedCase();
    const bar = aLoadEstimate({
      load: { from: 'typed', text: '279 N', uncertaintyText: '1.73 %' },
      width: { from: 'typed', text: '4.03 mm', uncertaintyText: '0.01' },
      depth: { from: 'typed', text: '2.98 mm', uncertaintyText: '0.01' },
      x: { from: 'typed', text: '0 mm', uncertaintyText: '0' },
      y: { from: 'typed', text: '300 µm', uncertaintyText: '12.5 µm' },
    });
    const view = await made(path, { ...bar, method: 'bend4.rect.local' });
    expectStress(view, [186.8, 8.4]);
    const face = view.outputs.find((output) => output.name === 'outerFibreStress');
    expect(face?.value).toBeCloseTo(233.9, 1);
    expect(face?.expandedUncertainty).toBeGreaterThan(5);
    expect(view.outputs.find((output) => output.name === 'originStress')?.value).toBe(view.origin.value);
  });

  it('reads inches as typed and keeps the typing', async () => {
    const { path } = await aMarkedCase();
    const inches = aLoadEstimate({ depth: { from: 'typed', text: '0.118 in', uncertaintyText: '0.0004' } });
    const depth = (await made(path, inches)).inputs.find((input) => input.name === 'depth');
    expect(depth).toMatchObject({ enteredText: '0.118 in', enteredUnit: 'in' });
    expect(depth?.value).toBeCloseTo(2.9972, 10);
    expect(depth?.standardUncertainty).toBeCloseTo(0.01016, 10);
  });

  it('is refused for a bare number where people use several units, by its field', async () => {
    const { path } = await aMarkedCase();
    const body = await refusedOf(path, aLoadEstimate({ load: { from: 'typed', text: '421', uncertaintyText: '2 %' } }));
    expect(body).toMatchObject({ code: 'not-valid', field: 'inputs.load' });
    expect(body.message).toContain('421 has no unit');
  });

  it('names every wrong input at once, and keeps nothing', async () => {
    const { path } = await aMarkedCase();
    const wrong = aLoadEstimate({
      load: { from: 'typed', text: '12,5 kg', uncertaintyText: '2 %' },
      width: { from: 'typed', text: '4 mm', uncertaintyText: '' },
    });
    const body = await refusedOf(path, wrong);
    expect(Object.keys(body.fields)).toEqual(['inputs.load', 'inputs.width']);
    expect(body.fields['inputs.width']).toBe('Width has no uncertainty: state one that is more than 0.');
    expect((await people.analyst.client.get(path)).body.estimates).toEqual([]);
  });

  it('says in words that the inner span must be less than the outer', async () => {
    const { path } = await aMarkedCase();
    const wide = aLoadEstimate({ innerSpan: { from: 'typed', text: '40 mm', uncertaintyText: '0.1' } });
    expect(await refusedOf(path, wide)).toMatchObject({
      code: 'not-valid',
      field: 'inputs.innerSpan',
      message: 'Inner span must be less than the outer span.',
    });
  });

  it('is refused for a radius of one boundary with the constant of another, unless a person says why', async () => {
    const marked = await aMarkedCase('inner');
    const refusal = await refusedOf(marked.path, mirrorEstimate(marked));
    expect(refusal).toMatchObject({ code: 'not-valid', field: 'inputs.R' });
    expect(refusal.message).toContain('inner boundary');
    const unstated = await aMarkedCase('not stated');
    expect(await refusedOf(unstated.path, mirrorEstimate(unstated))).toMatchObject({ field: 'inputs.R' });
    const boundaryNote = 'No mist is seen in this body; the two edges are one.';
    const view = await made(marked.path, { ...mirrorEstimate(marked), boundaryNote });
    expect(view.cautions[0]).toMatchObject({ code: 'boundary-overridden', note: boundaryNote });
  });

  it('takes no toughness for a mirror constant and no flaw for a mirror', async () => {
    const marked = await aMarkedCase();
    const wanted = mirrorEstimate(marked);
    const swapped = { ...wanted, inputs: { ...wanted.inputs, A: { from: 'constant', constantId: marked.toughness } } };
    expect(await refusedOf(marked.path, swapped)).toMatchObject({ field: 'inputs.A' });
    const R = { from: 'mark', markId: marked.marks.flaw, quantity: 'flaw half-axis, depth' };
    expect(await refusedOf(marked.path, { ...wanted, inputs: { ...wanted.inputs, R } })).toMatchObject({
      field: 'inputs.R',
    });
  });

  it('gets numbers 1 and 2 when two people make one at the same time', async () => {
    const { path } = await aMarkedCase();
    const both = await Promise.all(
      [people.analyst, people.secondAnalyst].map(({ client }) => client.post(path, aLoadEstimate())),
    );
    expect(both.map(({ body }) => body.number).sort()).toEqual([1, 2]);
  });

  it('can be made again only once from the same one', async () => {
    const { path } = await aMarkedCase();
    const first = await made(path, aLoadEstimate());
    const answers = await Promise.all(
      [people.analyst, people.secondAnalyst].map(({ client }) => client.post(`${path}/${first.id}/renewed`)),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(answers.find(({ status }) => status === 409)?.body.code).toBe('stale-version');
  });

  it('stays shown when it is set aside with a reason, and is compared no more', async () => {
    const { path } = await aMarkedCase();
    const view = await made(path, aLoadEstimate());
    const { client } = people.analyst;
    const reason = 'The load cell was overdue.';
    expect((await client.post(`${path}/${view.id}/standing`, { standing: 'set aside', reason: ' ' })).status).toBe(422);
    const { body } = await client.post(`${path}/${view.id}/standing`, { standing: 'set aside', reason });
    expect(EstimateView.parse(body)).toMatchObject({ isCompared: false, standing: { standing: 'set aside', reason } });
    const again = await client.post(`${path}/${view.id}/standing`, { standing: 'in use', reason: 'Cell was checked.' });
    expect(EstimateView.parse(again.body).isCompared).toBe(true);
  });

  it('is refused under a closed case, by the server and by the database', async () => {
    const { id, path } = await aMarkedCase();
    const view = await made(path, aLoadEstimate());
    await closeByHand(server, id);
    expect(await refusedOf(path, aLoadEstimate())).toMatchObject({ code: 'closed-case' });
    expect((await people.analyst.client.post(`${path}/${view.id}/renewed`)).body.code).toBe('closed-case');
    const copied = server.parts.database.db.execute(sql`
      insert into estimates select gen_random_uuid(), case_id, 99, line, method, method_version, stress_mpa,
        standard_uncertainty_mpa, outputs, budget, cautions, null, remark, made_by, made_at
      from estimates where id = ${view.id}`);
    await expect(copied).rejects.toMatchObject({ cause: { code: 'HB001' } });
  });

  it('is never changed once kept, whatever the case', async () => {
    const { path } = await aMarkedCase();
    const view = await made(path, aLoadEstimate());
    const changed = server.parts.database.db.execute(sql`update estimates set stress_mpa = 1 where id = ${view.id}`);
    await expect(changed).rejects.toMatchObject({ cause: { code: 'HB002' } });
  });

  it('is there for the laboratory and not for an outsider', async () => {
    const { path } = await aMarkedCase();
    const view = await made(path, aLoadEstimate());
    expect((await people.manager.client.get(path)).status).toBe(200);
    expect((await people.manager.client.post(path, aLoadEstimate())).status).toBe(403);
    expect((await people.outsider.client.get(`${path}/${view.id}`)).status).toBe(404);
    expect((await people.requester.client.get(path)).status).toBe(403);
  });
});

describe('every estimate that is kept', () => {
  it('recomputes to the last digit by its own method version', async () => {
    const reader = server.parts.database;
    const stored = await reader.db.select({ id: estimates.id }).from(estimates);
    expect(stored.length).toBeGreaterThan(8);
    for (const { id } of stored) {
      expect(await recomputeEstimate(reader, id)).toMatchObject({ same: true });
    }
  });

  it('answers what it recomputes to at its own address', async () => {
    const { path } = await aMarkedCase();
    const view = await made(path, aLoadEstimate());
    const { body } = await people.manager.client.get(`${path}/${view.id}/recomputed`);
    expect(RecomputedView.parse(body)).toMatchObject({ same: true, largestDifference: 0 });
  });

  it('comes out of no route without its interval', async () => {
    const marked = await aMarkedCase();
    const views = [aLoadEstimate(), mirrorEstimate(marked), flawEstimate(marked)];
    const answers: unknown[] = [];
    for (const wanted of views) answers.push(await made(marked.path, wanted));
    const { client } = people.analyst;
    const list = (await client.get(marked.path)).body;
    answers.push(list, (await client.get(`${marked.path}/${list.estimates[0].id}/recomputed`)).body);
    expect(stressesWithoutInterval(answers)).toEqual([]);
    expect(stressesWithoutInterval({ stress: { value: 350, unit: 'MPa' } })).toEqual(['stress']);
  });
});
