import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { EstimatesView, type EstimateView } from '#shared/contracts/estimates.ts';
import {
  aCalibration,
  aCase,
  aConstant,
  aFractograph,
  aLoadEstimate,
  aMaterial,
  markFace,
  rebind,
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

/** A case with one estimate a line: load typed, mirror and flaw read off one image. */
async function aReckonedCase() {
  const { id, number } = await aCase(people);
  const calibrationId = await aCalibration(people, 0.55);
  const image = await aFractograph(people, id, 1, calibrationId);
  const marks = await markFace(people.analyst, { number, imageId: image.id }, { radiusPx: 1018, flawPx: 116.4 });
  const materialId = await aMaterial(people);
  const toughness = await aConstant(people, { materialId, kind: 'toughness', value: 3.5, expanded: 0.2 });
  const outer = { materialId, kind: 'mirror constant, outer', value: 8.5, expanded: 0.6 } as const;
  const mirrorConstant = await aConstant(people, outer);
  const path = `/cases/${number}/estimates`;
  await keep(path, aLoadEstimate());
  await keep(path, {
    method: 'mirror.stress',
    inputs: {
      A: { from: 'constant', constantId: mirrorConstant },
      R: { from: 'mark', markId: marks.mirror, quantity: 'mirror radius', relativeUncertaintyPercent: 6 },
    },
  });
  await keep(path, {
    method: 'flaw.stress',
    inputs: {
      KIc: { from: 'constant', constantId: toughness },
      Y: { from: 'typed', text: '1.29', uncertaintyText: '6 %' },
      c: { from: 'mark', markId: marks.flaw, quantity: 'flaw half-axis, depth', relativeUncertaintyPercent: 10 },
    },
  });
  return { id, number, image, marks, materialId, toughness, path, calibrationId };
}

async function keep(path: string, wanted: unknown): Promise<void> {
  expect((await people.analyst.client.post(path, wanted)).status).toBe(201);
}

async function read(path: string): Promise<EstimatesView> {
  const { body } = await people.manager.client.get(path);
  expect(stressesWithoutInterval(body)).toEqual([]);
  return EstimatesView.parse(body);
}

/** Lines of estimates in force that are stale. */
const staleLines = ({ estimates }: EstimatesView) =>
  estimates.filter((each) => each.supersededById === null && each.stale).map((each) => each.line);

const ofLine = ({ estimates }: EstimatesView, line: EstimateView['line']): EstimateView => {
  const found = estimates.find((each) => each.line === line && each.supersededById === null);
  if (!found) throw new Error(`no ${line} line in force`);
  return found;
};

async function moveFlaw(reckoned: Awaited<ReturnType<typeof aReckonedCase>>, halfAxisPx: number) {
  const { number, image, marks } = reckoned;
  const at = `/cases/${number}/fractographs/${image.id}/marks/${marks.flaw}`;
  const { status } = await people.secondAnalyst.client.patch(at, {
    versionSeen: 1,
    geometry: {
      shape: 'ellipse',
      centre: { x: 1500, y: 1500 },
      halfAxisDepthPx: halfAxisPx,
      halfAxisAlongPx: halfAxisPx,
      turnDeg: 0,
      flawShape: 'half-ellipse',
      place: 'surface',
      points: [],
    },
  });
  expect(status).toBe(200);
}

describe('a mark that is moved', () => {
  it('makes exactly the estimates read from it stale, and says what they would become', async () => {
    const reckoned = await aReckonedCase();
    await moveFlaw(reckoned, 130);
    const view = await read(reckoned.path);
    expect(staleLines(view)).toEqual(['flaw']);
    const flaw = ofLine(view, 'flaw');
    expect(flaw.stale?.causes[0]?.why).toContain('was moved by Second Reader');
    expect(flaw.stale?.wouldBe?.value).toBeCloseTo(339.1 * Math.sqrt(116.4 / 130), 0);
    expect(flaw.stale).toMatchObject({ verdictNow: 'agree', verdictThen: 'agree', hindrance: null });
    expect(flaw.stale?.changes.map((change) => change.label)).toEqual(['Flaw size']);
    expect(flaw.inputs.filter((input) => input.stale).map((input) => input.name)).toEqual(['c']);
  });

  it('says that the verdict would move where it would', async () => {
    const reckoned = await aReckonedCase();
    await moveFlaw(reckoned, 30);
    expect(ofLine(await read(reckoned.path), 'flaw').stale).toMatchObject({
      verdictNow: 'agree',
      verdictThen: 'disagree',
    });
  });

  it('leaves the old estimate as it was when the new value is taken, and the new one fresh', async () => {
    const reckoned = await aReckonedCase();
    const before = ofLine(await read(reckoned.path), 'flaw');
    await moveFlaw(reckoned, 130);
    const wouldBe = ofLine(await read(reckoned.path), 'flaw').stale?.wouldBe;
    const { body } = await people.analyst.client.post(`${reckoned.path}/${before.id}/renewed`);
    expect(body).toMatchObject({ number: 4, supersedesId: before.id, stale: null, origin: wouldBe });
    const after = (await read(reckoned.path)).estimates.find((each) => each.id === before.id);
    expect(after).toMatchObject({ origin: before.origin, supersededById: body.id, stale: null });
  });

  it('leaves the estimate fresh when the old value is kept with a reason, and the reason readable', async () => {
    const reckoned = await aReckonedCase();
    await moveFlaw(reckoned, 118);
    const { id } = ofLine(await read(reckoned.path), 'flaw');
    const { client } = people.analyst;
    expect((await client.post(`${reckoned.path}/${id}/kept`, { reason: '' })).status).toBe(422);
    const { body } = await client.post(`${reckoned.path}/${id}/kept`, { reason: 'The move is within the reading.' });
    expect(body).toMatchObject({ stale: null, kept: [{ reason: 'The move is within the reading.' }] });
    expect((await client.post(`${reckoned.path}/${id}/kept`, { reason: 'Again.' })).body.code).toBe('wrong-state');
  });
});

describe('a mark that is taken off', () => {
  it('leaves its estimate standing, stale, with the reason why it cannot be made again', async () => {
    const reckoned = await aReckonedCase();
    const at = `/cases/${reckoned.number}/fractographs/${reckoned.image.id}/marks/${reckoned.marks.flaw}`;
    expect((await people.analyst.client.delete(at, { versionSeen: 1 })).status).toBe(200);
    const flaw = ofLine(await read(reckoned.path), 'flaw');
    expect(flaw.stale).toMatchObject({ wouldBe: null, verdictThen: null });
    expect(flaw.stale?.hindrance).toContain('can no longer be read');
    const { body } = await people.analyst.client.post(`${reckoned.path}/${flaw.id}/renewed`);
    expect(body).toMatchObject({ code: 'not-valid', field: 'inputs.c' });
  });
});

describe('an image that is bound to another scale', () => {
  it('makes both image lines stale and leaves the load line alone', async () => {
    const reckoned = await aReckonedCase();
    await rebind(people, reckoned.number, reckoned.image, await aCalibration(people, 0.5599));
    const view = await read(reckoned.path);
    expect(staleLines(view)).toEqual(['mirror', 'flaw']);
    expect(ofLine(view, 'mirror').stale?.wouldBe?.value).toBeCloseTo(356.0, 1);
    expect(ofLine(view, 'flaw').stale?.wouldBe?.value).toBeCloseTo(336.1, 1);
  });
});

describe('a constant that is replaced', () => {
  it('makes stale what hangs on it, in closed cases too, where nothing else changes', async () => {
    const reckoned = await aReckonedCase();
    const before = await read(reckoned.path);
    await closeByHand(server, reckoned.id);
    const { materialId, toughness } = reckoned;
    await aConstant(people, { materialId, kind: 'toughness', value: 3.3, expanded: 0.2, supersedesId: toughness });
    const after = await read(reckoned.path);
    expect(staleLines(after)).toEqual(['flaw']);
    expect(ofLine(after, 'flaw').stale?.changes).toMatchObject([{ label: 'Fracture toughness' }]);
    expect(ofLine(after, 'flaw').stale?.wouldBe?.value).toBeCloseTo((339.1 * 3.3) / 3.5, 0);
    expect(after.estimates.map((each) => each.origin)).toEqual(before.estimates.map((each) => each.origin));
    const { id } = ofLine(after, 'flaw');
    const kept = await people.analyst.client.post(`${reckoned.path}/${id}/kept`, { reason: 'No.' });
    expect(kept.body.code).toBe('closed-case');
  });
});

describe('a constant that is replaced while an estimate is made with it', () => {
  it('either refuses the estimate or turns it stale', async () => {
    const { path, materialId, toughness, marks } = await aReckonedCase();
    const wanted = {
      method: 'flaw.stress',
      inputs: {
        KIc: { from: 'constant', constantId: toughness },
        Y: { from: 'typed', text: '1.29', uncertaintyText: '6 %' },
        c: { from: 'mark', markId: marks.flaw, quantity: 'flaw half-axis, depth' },
      },
    };
    const newer = { materialId, kind: 'toughness', value: 3.3, expanded: 0.2, supersedesId: toughness } as const;
    const [{ status, body }] = await Promise.all([people.analyst.client.post(path, wanted), aConstant(people, newer)]);
    if (status === 201) expect(ofLine(await read(path), 'flaw').stale).not.toBeNull();
    else expect(body).toMatchObject({ code: 'not-valid', field: 'inputs.KIc' });
    const late = await people.analyst.client.post(path, wanted);
    expect(late.body).toMatchObject({ code: 'not-valid', field: 'inputs.KIc' });
  });
});

describe('a calibration that is replaced', () => {
  it('tells a closed case what its lines would be by the one in force', async () => {
    const reckoned = await aReckonedCase();
    await closeByHand(server, reckoned.id);
    await aCalibration(people, 0.5599, reckoned.calibrationId);
    const view = await read(reckoned.path);
    expect(staleLines(view)).toEqual(['mirror', 'flaw']);
    expect(ofLine(view, 'mirror').stale?.wouldBe?.value).toBeCloseTo(356.0, 1);
    expect(ofLine(view, 'mirror').stale?.verdictThen).toBe('agree');
  });

  it('asks for the image to be bound anew before a line is made again', async () => {
    const reckoned = await aReckonedCase();
    const newer = await aCalibration(people, 0.5599, reckoned.calibrationId);
    const { id } = ofLine(await read(reckoned.path), 'mirror');
    const path = `${reckoned.path}/${id}/renewed`;
    expect((await people.analyst.client.post(path)).body).toMatchObject({ field: 'inputs.R' });
    await rebind(people, reckoned.number, reckoned.image, newer);
    expect((await people.analyst.client.post(path)).body).toMatchObject({ stale: null, line: 'mirror' });
  });
});
