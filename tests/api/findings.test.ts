import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeFindings } from '#server/features/findings/service/write-findings.ts';
import { openCase } from '#server/rights/open-case.ts';
import {
  BindableList,
  BoundValueList,
  BoundValueView,
  FigureList,
  FigureView,
  FindingsFacts,
  FindingsVersionView,
  type FindingsNode,
} from '#shared/contracts/findings.ts';
import type { CaseNumber } from '#shared/contracts/ids.ts';
import {
  aCalibration,
  aCase,
  aConstant,
  aFractograph,
  aLoadEstimate,
  aMaterial,
  markFace,
} from '#tests/support/a-bar-case.ts';
import { aReadyImage, anImage } from '#tests/support/an-image.ts';
import { closeByHand } from '#tests/support/close-by-hand.ts';
import { aLaboratory, startTestServer, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const plain = (text: string) => text.replaceAll('\u00A0', ' ');
const text = (words: string): FindingsNode => ({ type: 'text', text: words });
const heading = (words: string): FindingsNode => ({ type: 'heading', attrs: { level: 2 }, content: [text(words)] });
const paragraph = (...content: FindingsNode[]): FindingsNode => ({ type: 'paragraph', content });
const bound = (bindingId: string): FindingsNode => ({ type: 'boundValue', attrs: { bindingId } });

/** A bar with its three lines reckoned; the toughness can be replaced. */
async function aReckonedCase() {
  const { id, number } = await aCase(people);
  const image = await aFractograph(people, id, 1, await aCalibration(people, 0.55));
  const marks = await markFace(people.analyst, { number, imageId: image.id }, { radiusPx: 1018, flawPx: 116.4 });
  const materialId = await aMaterial(people);
  const mirrorConstant = await aConstant(people, {
    materialId,
    kind: 'mirror constant, outer',
    value: 8.5,
    expanded: 0.6,
  });
  const client = people.analyst.client;
  const estimated = async (wanted: unknown) => {
    const { status, body } = await client.post(`/cases/${number}/estimates`, wanted);
    expect(status).toBe(201);
    return String(body.id ?? body);
  };
  await estimated(aLoadEstimate());
  await estimated({
    method: 'mirror.stress',
    inputs: {
      A: { from: 'constant', constantId: mirrorConstant },
      R: { from: 'mark', markId: marks.mirror, quantity: 'mirror radius', relativeUncertaintyPercent: 6 },
    },
  });
  const { estimates } = (await client.get(`/cases/${number}/estimates`)).body;
  const load = estimates.find((each: { line: string }) => each.line === 'load').id;
  const mirror = estimates.find((each: { line: string }) => each.line === 'mirror').id;
  return { id, number, at: `/cases/${number}/findings`, image, marks, materialId, mirrorConstant, load, mirror };
}

type Reckoned = Awaited<ReturnType<typeof aReckonedCase>>;

async function bind({ at }: Reckoned, wanted: Record<string, unknown>, client = people.analyst.client) {
  const { status, body } = await client.post(`${at}/bound-values`, wanted);
  expect(status, JSON.stringify(body)).toBe(201);
  return BoundValueView.parse(body);
}

const valuesOf = async ({ at }: Reckoned) =>
  BoundValueList.parse((await people.analyst.client.get(`${at}/bound-values`)).body);

async function moveMirror({ number, image, marks }: Reckoned, radiusPx: number) {
  const path = `/cases/${number}/fractographs/${image.id}/marks`;
  const mark = (await people.analyst.client.get(path)).body.find((each: { id: string }) => each.id === marks.mirror);
  const points = [
    { x: 1500 - radiusPx, y: 1500 },
    { x: 1500 + radiusPx, y: 1500 },
  ];
  const moved = await people.analyst.client.patch(`${path}/${marks.mirror}`, {
    versionSeen: mark.version,
    geometry: { shape: 'chain', points },
  });
  expect(moved.status).toBe(200);
}

async function write(number: CaseNumber, nodes: FindingsNode[]): Promise<void> {
  const { context } = people.analyst;
  await writeFindings(context, await openCase(context, number, 'write findings'), nodes);
}

const factsOf = async ({ at }: Reckoned) => FindingsFacts.parse((await people.analyst.client.get(`${at}/facts`)).body);

describe('a value bound into the findings', () => {
  it('reads what its estimate, its mark or its constant says, always with its interval', async () => {
    const bar = await aReckonedCase();
    const load = await bind(bar, { sourceKind: 'estimate', sourceId: bar.load, quantity: 'stress at the origin' });
    const coarse = await bind(bar, {
      sourceKind: 'estimate',
      sourceId: bar.load,
      quantity: 'outer-fibre stress',
      format: { decimals: 1 },
    });
    const radius = await bind(bar, { sourceKind: 'measurement', markId: bar.marks.mirror, measured: 'mirror radius' });
    const constant = await bind(bar, { sourceKind: 'material constant', sourceId: bar.mirrorConstant });
    expect(plain(load.text)).toBe('350 ± 14 MPa');
    expect(plain(coarse.text)).toMatch(/^350\.0 ± 1\d\.\d MPa$/);
    expect(plain(radius.text)).toMatch(/^559\.9 ± 2\.8 µm$/);
    expect(plain(constant.text)).toBe('8.50 ± 0.60 MPa m½');
    expect(load.words).toBe('Stress at the origin, load line');
    expect(radius.sourceWords).toBe('mark m2, Fig. 1');
    for (const { text: said } of await valuesOf(bar)) expect(said).toContain('±');
  });

  it('is offered in a list with what it says now', async () => {
    const bar = await aReckonedCase();
    const list = BindableList.parse((await people.analyst.client.get(`${bar.at}/bindable-values`)).body);
    expect(list.map((each) => each.words)).toEqual(
      expect.arrayContaining(['Stress at the origin, load line', 'Stress at the origin, mirror line', 'Mirror radius']),
    );
    for (const { bind: wanted } of list) await bind(bar, wanted);
    expect(await valuesOf(bar)).toHaveLength(list.length);
  });

  it('turns stale when a mark is moved, says what it would read, and takes the new value', async () => {
    const bar = await aReckonedCase();
    const radius = await bind(bar, { sourceKind: 'measurement', markId: bar.marks.mirror, measured: 'mirror radius' });
    await moveMirror(bar, 1200);
    const [stale] = await valuesOf(bar);
    expect(stale).toMatchObject({ id: radius.id, text: radius.text });
    expect(stale.stale?.why).toContain('m2');
    expect(plain(stale.stale?.would ?? '')).toMatch(/^660\.\d ± \d\.\d µm$/);
    const { status, body } = await people.analyst.client.post(`${bar.at}/bound-values/${radius.id}/renew`);
    expect(status).toBe(201);
    expect(body).toMatchObject({ text: stale.stale?.would, stale: null });
    const [old, fresh] = await valuesOf(bar);
    expect(old.stale).toMatchObject({ why: 'a newer value was taken in its place', would: fresh.text });
    const again = await people.secondAnalyst.client.post(`${bar.at}/bound-values/${radius.id}/renew`);
    expect(again.body.id).toBe(fresh.id);
  });

  it('makes a stale estimate again when its new value is taken, but only for who may estimate', async () => {
    const bar = await aReckonedCase();
    const wanted = { sourceKind: 'estimate', sourceId: bar.mirror, quantity: 'stress at the origin' };
    const mirror = await bind(bar, wanted);
    const lower = { materialId: bar.materialId, kind: 'mirror constant, outer', value: 8.1, expanded: 0.6 } as const;
    await aConstant(people, { ...lower, supersedesId: bar.mirrorConstant });
    const would = (await valuesOf(bar))[0].stale?.would;
    expect(would).toBeTruthy();
    const refused = await people.analyst.client.post(`${bar.at}/bound-values`, wanted);
    expect(refused).toMatchObject({ status: 409, body: { code: 'not-ready' } });
    const engineer = await people.engineer.client.post(`${bar.at}/bound-values/${mirror.id}/renew`);
    expect(engineer.body).toMatchObject({
      code: 'not-ready',
      message: expect.stringContaining('an analyst makes it again'),
    });
    const { status, body } = await people.analyst.client.post(`${bar.at}/bound-values/${mirror.id}/renew`);
    expect(status).toBe(201);
    expect(body).toMatchObject({ text: would, stale: null });
    expect(body.sourceId).not.toBe(bar.mirror);
  });

  it('is kept as it was where a person says why', async () => {
    const bar = await aReckonedCase();
    const radius = await bind(bar, { sourceKind: 'measurement', markId: bar.marks.mirror, measured: 'mirror radius' });
    const keep = (reason: string) =>
      people.engineer.client.post(`${bar.at}/bound-values/${radius.id}/keep`, { reason });
    expect((await keep('It is not stale yet.')).body.code).toBe('wrong-state');
    await moveMirror(bar, 1020);
    expect((await keep('')).status).toBe(422);
    expect((await keep('Two pixels change nothing that is said.')).status).toBe(200);
    expect((await valuesOf(bar))[0]).toMatchObject({
      stale: null,
      keptBecause: 'Two pixels change nothing that is said.',
    });
  });

  it('is bound by those who write only, and from records of this case only', async () => {
    const [bar, other] = [await aReckonedCase(), await aReckonedCase()];
    const wanted = { sourceKind: 'estimate', sourceId: bar.load, quantity: 'stress at the origin' };
    expect((await people.manager.client.post(`${bar.at}/bound-values`, wanted)).body.code).toBe('not-allowed');
    expect((await people.outsider.client.post(`${bar.at}/bound-values`, wanted)).body.code).toBe('not-found');
    const foreign = { ...wanted, sourceId: other.load };
    expect((await people.analyst.client.post(`${bar.at}/bound-values`, foreign)).body.code).toBe('not-found');
    await closeByHand(server, bar.id);
    expect((await people.analyst.client.post(`${bar.at}/bound-values`, wanted)).body.code).toBe('closed-case');
  });

  it('shows nothing where its record is of another case', async () => {
    const [bar, other] = [await aReckonedCase(), await aReckonedCase()];
    const theirs = await bind(other, {
      sourceKind: 'estimate',
      sourceId: other.load,
      quantity: 'stress at the origin',
    });
    await write(bar.number, [paragraph(text('It carried '), bound(theirs.id), text('.'))]);
    expect(await factsOf(bar)).toMatchObject({ unresolved: 1, wordCount: 2 });
    await people.analyst.client.post(`${bar.at}/versions`, { name: 'Smuggled' });
    const { body } = await people.analyst.client.get(`${bar.at}/versions/1`);
    const version = FindingsVersionView.parse(body);
    expect(JSON.stringify(version.content)).toContain('not in this case');
    expect(JSON.stringify(version.content)).not.toContain('MPa');
  });
});

describe('a figure in the findings', () => {
  async function aFigure() {
    const { id, number } = await aCase(people);
    const image = await aReadyImage(people.analyst, number, await anImage('tiff', { widthPx: 3000, heightPx: 2000 }));
    const marks = await markFace(people.analyst, { number, imageId: image.id }, { radiusPx: 400, flawPx: 116 });
    const at = `/cases/${number}/findings`;
    const wanted = { fractographId: image.id, markIds: [marks.origin, marks.mirror], caption: 'Origin and mirror.' };
    const { status, body } = await people.analyst.client.post(`${at}/figures`, wanted);
    expect({ status, body }).toMatchObject({ status: 201 });
    return { id, number, at, image, marks, figure: FigureView.parse(body), wanted };
  }

  it('is drawn with its marks, and says uncalibrated where no scale is bound', async () => {
    const { at, figure } = await aFigure();
    const drawn = await people.manager.client.get(`${at}/figures/${figure.id}/image.svg`);
    expect(drawn.headers.get('content-type')).toContain('image/svg+xml');
    const svg = String(drawn.body);
    expect(svg).toContain('>m1<');
    expect(svg).toContain('>m2<');
    expect(svg).not.toContain('>m3<');
    expect(svg).toContain('uncalibrated');
    expect(svg).toContain('data:image/webp;base64,');
    expect((await people.outsider.client.get(`${at}/figures/${figure.id}/image.svg`)).status).toBe(404);
  });

  it('turns stale when a mark in it is moved, and follows it when drawn again; the old one stays as it was', async () => {
    const { at, number, image, marks, figure } = await aFigure();
    const before = String((await people.analyst.client.get(`${at}/figures/${figure.id}/image.svg`)).body);
    const path = `/cases/${number}/fractographs/${image.id}/marks/${marks.mirror}`;
    const points = [
      { x: 1000, y: 1500 },
      { x: 2000, y: 1500 },
    ];
    await people.analyst.client.patch(path, { versionSeen: 1, geometry: { shape: 'chain', points } });
    const [stale] = FigureList.parse((await people.analyst.client.get(`${at}/figures`)).body);
    expect(stale.stale?.why).toContain('m2');
    const again = await people.analyst.client.post(`${at}/figures/${figure.id}/renew`);
    expect(again).toMatchObject({ status: 201, body: { stale: null, figureNumber: 1 } });
    const after = String((await people.analyst.client.get(`${at}/figures/${again.body.id}/image.svg`)).body);
    expect(after).not.toBe(before);
    expect(String((await people.analyst.client.get(`${at}/figures/${figure.id}/image.svg`)).body)).toBe(before);
  });

  it('takes no mark of another image and needs words', async () => {
    const { at, wanted } = await aFigure();
    const other = await aFigure();
    const post = (more: object) => people.analyst.client.post(`${at}/figures`, { ...wanted, ...more });
    expect((await post({ markIds: [other.marks.origin] })).body).toMatchObject({ code: 'not-valid', field: 'markIds' });
    expect((await post({ fractographId: other.image.id, markIds: [] })).status).toBe(404);
    expect((await post({ caption: ' ' })).status).toBe(422);
  });
});

describe('a version of the findings', () => {
  it('holds the values written out and has the same hash for the same text', async () => {
    const bar = await aReckonedCase();
    const load = await bind(bar, { sourceKind: 'estimate', sourceId: bar.load, quantity: 'stress at the origin' });
    await write(bar.number, [heading('Stress at the origin'), paragraph(text('The edge carried '), bound(load.id))]);
    const keep = (name: string) => people.engineer.client.post(`${bar.at}/versions`, { name });
    const [first, second] = [await keep('First'), await keep('Second')];
    expect([first.body.number, second.body.number]).toEqual([1, 2]);
    expect(second.body.contentHash).toBe(first.body.contentHash);
    const { body } = await people.manager.client.get(`${bar.at}/versions/1`);
    expect(FindingsVersionView.parse(body).content).toMatchObject({
      type: 'doc',
      content: [
        { type: 'heading', attrs: { level: 2 } },
        {
          type: 'paragraph',
          content: [{ type: 'text' }, { type: 'boundValue', attrs: { text: load.text, stale: false } }],
        },
      ],
    });
    await write(bar.number, [paragraph(text('Another text.'))]);
    expect((await keep('Third')).body.contentHash).not.toBe(first.body.contentHash);
    expect((await people.analyst.client.get(`${bar.at}/versions/9`)).status).toBe(404);
  });

  it('is numbered once when two keep one at the same moment', async () => {
    const bar = await aReckonedCase();
    const both = await Promise.all(
      [people.analyst, people.engineer].map(({ client }) => client.post(`${bar.at}/versions`, { name: 'At once' })),
    );
    expect(both.map(({ body }) => body.number).sort()).toEqual([1, 2]);
  });
});

describe('what the readiness list asks of the findings', () => {
  it('counts words, stale values with their part, and parts that are empty', async () => {
    const bar = await aReckonedCase();
    const radius = await bind(bar, { sourceKind: 'measurement', markId: bar.marks.mirror, measured: 'mirror radius' });
    await write(bar.number, [
      heading('What the surface shows'),
      paragraph(text('The mirror reaches '), bound(radius.id), text(' from the origin.')),
      heading('What to do'),
      paragraph(text(' ')),
    ]);
    expect(await factsOf(bar)).toMatchObject({ emptyParts: ['What to do'], staleBoundValues: [], unresolved: 0 });
    await moveMirror(bar, 1100);
    expect(await factsOf(bar)).toMatchObject({
      wordCount: 13,
      staleBoundValues: [{ words: 'Mirror radius', part: 'What the surface shows' }],
    });
  });
});
