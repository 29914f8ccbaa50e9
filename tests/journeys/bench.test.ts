import type { Browser, Page, Route } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import type { MarkView } from '#shared/contracts/marks.ts';
import { drawFractureSurface } from '#server/imaging/synthetic-surface/draw-fracture-surface.ts';
import { encodeFractureSurface } from '#server/imaging/synthetic-surface/encode-fracture-surface.ts';
import type { FractureSurfaceSpec, SurfaceTruth } from '#server/imaging/synthetic-surface/surface-spec.ts';
import { aCase } from '../support/a-bar-case.ts';
import { aReadyImage, bringIn, settled } from '../support/an-image.ts';
import { openBrowser, pageOf, type SignedInPage } from '../support/browser.ts';
import { builtPages } from '../support/pages.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

const aSurface: FractureSurfaceSpec = {
  seed: 11,
  widthPx: 1600,
  heightPx: 1200,
  pixelSizeUm: 0.5,
  origin: { xPx: 800, yPx: 1080 },
  originDepthUm: 0,
  flaw: { kind: 'surface-crack', halfAxisDepthUm: 70, halfAxisAlongUm: 80 },
  mirrorRadiusUm: 280,
  scaleBarUm: 200,
  body: 'fine',
};

const aPart = {
  description: 'Bar',
  serial: null,
  drawing: null,
  maker: null,
  materialId: null,
  environment: null,
  temperatureC: 20,
  serviceTime: 'none',
};
const aPiece = (partId: string) => ({
  partId,
  parentId: null,
  way: 'break',
  description: 'half of the bar',
  mass: '6.4 g ± 0.1 g',
  place: 'safe S2',
  holder: 'Ana Lyst',
  condition: null,
  receivedOn: '2026-06-22',
});

let pages: Awaited<ReturnType<typeof builtPages>>;
let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let browser: Browser;
let truth: SurfaceTruth;
let number: string;
let image: FractographView;
let ana: SignedInPage;

beforeAll(async () => {
  pages = await builtPages();
  server = await startTestServer({ withoutPages: false, pagesFolder: pages.folder });
  people = await aLaboratory(server);
  browser = await openBrowser();
  const surface = drawFractureSurface(aSurface);
  truth = surface.truth;
  number = (await aCase(people)).number;
  image = await aReadyImage(people.analyst, number, await encodeFractureSurface(surface, 'png'), 'face.png');
  const bound = await people.analyst.client.post(`/cases/${number}/fractographs/${image.id}/calibrations`, {
    reading: { way: 'typed', pixelSizeXUm: 0.5, relativeUncertainty: 0.004, source: 'stage scale SM-2', typed: '0.5' },
    bindingSeen: null,
  });
  expect(bound.status, JSON.stringify(bound.body)).toBe(201);
  ana = await pageOf(browser, server.address, people.analyst);
}, 180_000);

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  await pages?.drop();
});

const benchPath = () => `/cases/${number}/fractographs/${image.id}`;
const look = (page: Page, name: string) =>
  process.env.HACKLEBOOK_LOOK ? page.screenshot({ path: `${process.env.HACKLEBOOK_LOOK}/${name}.png` }) : undefined;

/** Brings a drawn surface in as the image of one face, and waits until it is ready. */
async function aFace(ofCase: string, spec: FractureSurfaceSpec, face: { fragmentId: string; face: string }) {
  const bytes = await encodeFractureSurface(drawFractureSurface(spec), 'png');
  const { body } = await bringIn(people.analyst, ofCase, { name: 'face.png', bytes }, { ...face, view: 'mirror' });
  return (await settled(people.analyst, ofCase, String(body.id))).id;
}

async function open(page: Page): Promise<void> {
  await page.goto(benchPath());
  await page.locator('[data-face="first"][data-whole="true"]').waitFor();
}

/** Where a place of the image is on the page, while the whole image is fitted. */
async function onPage(page: Page, at: { x: number; y: number }) {
  const box = await page.locator('[data-face="first"]').boundingBox();
  if (!box) throw new Error('no face on the page');
  // the face has a border of a px on each side
  const [width, height] = [box.width - 2, box.height - 2];
  const scale = Math.min(width / 1600, height / 1200);
  return {
    x: box.x + 1 + width / 2 + (at.x - 800) * scale,
    y: box.y + 1 + height / 2 + (at.y - 600) * scale,
  };
}

async function clickAt(page: Page, at: { x: number; y: number }): Promise<void> {
  const place = await onPage(page, at);
  await page.mouse.move(place.x, place.y);
  await page.mouse.down();
  await page.mouse.up();
}

async function marksKept(count: number): Promise<MarkView[]> {
  for (let tries = 0; ; tries += 1) {
    const { body } = await people.analyst.client.get(`/cases/${number}/marks`);
    if (body.length >= count || tries > 80) return body;
    await new Promise((done) => setTimeout(done, 100));
  }
}

const onMirror = (degrees: number) => {
  const radius = truth.mirror?.radiusPx ?? 0;
  const angle = (degrees * Math.PI) / 180;
  return { x: truth.origin.xPx + radius * Math.cos(angle), y: truth.origin.yPx - radius * Math.sin(angle) };
};

describe('reading a fracture surface on the bench', () => {
  it('draws the origin and the mirror by pointer, and reads the radius that is there', async () => {
    const { page } = ana;
    await open(page);
    await look(page, 'bench-empty');
    await page.keyboard.press('o');
    await clickAt(page, { x: truth.origin.xPx, y: truth.origin.yPx });
    await page.getByRole('row', { name: /m1/ }).first().waitFor();
    await page.keyboard.press('m');
    for (const degrees of [178, 150, 120, 90, 60, 30]) await clickAt(page, onMirror(degrees));
    await clickAt(page, onMirror(2));
    await clickAt(page, onMirror(2));
    const [origin, mirror] = await marksKept(2);
    expect(origin.kind).toBe('origin');
    expect(mirror).toMatchObject({ kind: 'mirror', boundary: 'outer' });
    const { body } = await people.analyst.client.get(`/cases/${number}/measurements`);
    const radiusUm = body[0].valueMm * 1000;
    // a click falls on a whole px of screen, here about 2 px of the image of 0.5 µm
    expect(Math.abs(radiusUm - 280)).toBeLessThan(3);
    await page
      .getByRole('row', { name: /Mirror/ })
      .getByText(/R 2[78]\d/)
      .waitFor();
    await look(page, 'bench-1440');
  });

  it('draws an origin at the very px by keyboard alone', async () => {
    const { page } = ana;
    await page.keyboard.press('Escape');
    await page.keyboard.press('h');
    await page.keyboard.press('Enter');
    for (let press = 0; press < 4; press += 1) await page.keyboard.press('Shift+ArrowUp');
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('Enter');
    const marks = await marksKept(3);
    const { geometry } = marks[2];
    if (geometry.shape !== 'segment') throw new Error('no segment');
    const scale = (await onPage(page, { x: 1, y: 0 })).x - (await onPage(page, { x: 0, y: 0 })).x;
    expect((geometry.from.y - geometry.to.y) * scale).toBeCloseTo(40, 6);
    expect((geometry.to.x - geometry.from.x) * scale).toBeCloseTo(1, 6);
  });

  it('shows the same coordinates after a reload, at every closeness', async () => {
    const { page } = ana;
    const before = await marksKept(3);
    await page.keyboard.press('Escape');
    for (let press = 0; press < 6; press += 1) await page.keyboard.press('+');
    await look(page, 'bench-close');
    await open(page);
    expect(await marksKept(3)).toEqual(before);
    await page.getByRole('button', { name: 'm1, Origin' }).click();
    const x = await page.getByLabel('m1, x, px').inputValue();
    expect(Number(x)).toBeCloseTo(before[0].geometry.shape === 'point' ? before[0].geometry.at.x : NaN, 1);
    await look(page, 'bench-selected');
  });

  it('moves a mark by its handle, takes it back with Ctrl Z, and moves it by its numbers', async () => {
    const { page } = ana;
    const from = await onPage(page, { x: truth.origin.xPx, y: truth.origin.yPx });
    await page.mouse.move(from.x, from.y);
    await page.mouse.down();
    await page.mouse.move(from.x + 30, from.y - 20, { steps: 4 });
    await page.mouse.up();
    await expectVersion(1, 2);
    await page.keyboard.press('Control+z');
    const back = await expectVersion(1, 3);
    expect(back.geometry).toMatchObject({ shape: 'point' });
    await page.getByLabel('m1, x, px').fill('801.5');
    await page.getByRole('button', { name: 'Move m1 there' }).click();
    expect((await expectVersion(1, 4)).geometry).toMatchObject({ at: { x: 801.5 } });
  });

  it('shows another person at the case, and what they draw', async () => {
    const second = await pageOf(browser, server.address, people.secondAnalyst);
    await open(second.page);
    await ana.page.getByText('Second Reader').waitFor();
    await second.page.keyboard.press('l');
    await clickAt(second.page, { x: 300, y: 300 });
    await clickAt(second.page, { x: 500, y: 300 });
    await ana.page.getByRole('button', { name: 'm4, Length' }).waitFor();
    await look(ana.page, 'bench-two-people');
    expect(second.complaints).toEqual([]);
    await second.context.close();
  });

  it('keeps both versions when two people move one mark, and asks', async () => {
    const { page } = ana;
    const overtaken = async (route: Route) => {
      // another was a moment faster
      const marks: MarkView[] = (await people.secondAnalyst.client.get(`/cases/${number}/marks`)).body;
      const mark = marks[3];
      const geometry = { shape: 'segment', from: { x: 310, y: 310 }, to: { x: 500, y: 300 } };
      const path = `/cases/${number}/fractographs/${image.id}/marks/${mark.id}`;
      await people.secondAnalyst.client.patch(path, { versionSeen: mark.version, geometry });
      await route.continue();
    };
    await page.route('**/marks/*', overtaken, { times: 1 });
    await page.getByRole('button', { name: 'm4, Length' }).click();
    await page.getByLabel('m4, to x, px').fill('600');
    await page.getByRole('button', { name: 'Move m4 there' }).click();
    await page.getByRole('dialog').getByText('m4 was changed by two people').waitFor();
    await look(page, 'bench-clash');
    await page.getByRole('button', { name: 'Keep your m4' }).click();
    expect((await expectVersion(4, 3)).geometry).toMatchObject({ to: { x: 600 } });
  });

  it('takes a mark off and brings it back', async () => {
    const { page } = ana;
    await page.getByRole('button', { name: 'Take m4 off' }).click();
    await page.getByText('m4 taken off').waitFor();
    expect(await marksKept(3)).toHaveLength(3);
    await page.getByRole('button', { name: 'Undo' }).click();
    expect(await marksKept(4)).toHaveLength(4);
  });

  it('waits with what is drawn while the server is out of reach, and sends it after', async () => {
    const { page, context } = ana;
    await page.locator('[data-face="first"]').focus();
    await context.setOffline(true);
    await page.keyboard.press('n');
    await clickAt(page, { x: 200, y: 900 });
    await page.getByText('does not answer').waitFor();
    await look(page, 'bench-offline');
    expect(await marksKept(4)).toHaveLength(4);
    await context.setOffline(false);
    expect(await marksKept(5)).toHaveLength(5);
  });

  it('reads the bar on the image for another scale', async () => {
    const { page } = ana;
    const bar = truth.scaleBar;
    if (!bar) throw new Error('no bar drawn');
    await page.getByRole('button', { name: 'Bind another scale' }).click();
    await page.getByLabel('Read the bar on the image').check();
    await page.getByRole('button', { name: 'Draw along the bar' }).click();
    for (const _reading of [1, 2]) {
      await clickAt(page, { x: bar.xPx, y: bar.yPx });
      await clickAt(page, { x: bar.xPx + bar.lengthPx, y: bar.yPx });
    }
    await page.getByLabel('Length of the scale bar').fill('200');
    await page.getByLabel('Why the scale changes').fill('the bar stands on the image itself');
    await look(page, 'bench-bar');
    await page.getByRole('button', { name: 'Bind the scale' }).click();
    await page.getByText(/bar of 200 µm read twice/).waitFor();
  });

  it('lays the mating face beside it, turned over, so that features answer each other', async () => {
    const matingNumber = (await aCase(people)).number;
    const at = `/cases/${matingNumber}`;
    const made = async (path: string, body: object) => (await people.analyst.client.post(`${at}${path}`, body)).body;
    const part = await made('/evidence/parts', { ...aPart });
    const [f1, f2] = [await made('/evidence/pieces', aPiece(part.id)), await made('/evidence/pieces', aPiece(part.id))];
    const [one, other] = [
      { fragmentId: f1.id, face: 'A' },
      { fragmentId: f2.id, face: 'A' },
    ];
    const spec = { ...aSurface, widthPx: 900, heightPx: 700, origin: { xPx: 300, yPx: 600 }, mirrorRadiusUm: 120 };
    const first = await aFace(matingNumber, spec, one);
    await aFace(matingNumber, { ...spec, origin: { xPx: 600, yPx: 600 }, face: 'mate' }, other);
    await made('/evidence/mates', { one, other, crack: null });
    const { page } = ana;
    await page.goto(`${at}/fractographs/${first}`);
    await page.locator('[data-face="first"][data-whole="true"]').waitFor();
    await page.locator('[data-face="mate"][data-whole="true"]').waitFor();
    await page.locator('[data-face="first"]').focus();
    await page.keyboard.press('+');
    await look(page, 'bench-mates');
    await page.keyboard.press('b');
    await page.locator('[data-face="mate"]').waitFor({ state: 'detached' });
    await page.keyboard.press('b');
    await page.locator('[data-face="mate"]').waitFor();
    await open(page);
  });

  it('folds at 1100 and 390 px without a sideways scroll', async () => {
    const { page } = ana;
    for (const [width, height] of [
      [1100, 1083],
      [390, 844],
    ]) {
      await page.setViewportSize({ width, height });
      await page.locator('[data-face="first"][data-whole="true"]').waitFor();
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(over).toBeLessThanOrEqual(0);
      await look(page, `bench-${width}`);
    }
    await page.setViewportSize({ width: 1440, height: 900 });
    await page.getByRole('button', { name: 'Daylight' }).click();
    await look(page, 'bench-daylight');
  });

  it('draws no complaint from the browser', () => {
    // the browser itself logs what was refused as a clash, and what was asked while it was offline
    const meant = /409 \(Conflict\)|ERR_INTERNET_DISCONNECTED/;
    expect(ana.complaints.filter((words) => !meant.test(words))).toEqual([]);
  });
});

/** Waits until mark m-number has reached a version. */
async function expectVersion(markNumber: number, version: number): Promise<MarkView> {
  for (let tries = 0; ; tries += 1) {
    const marks: MarkView[] = (await people.analyst.client.get(`/cases/${number}/marks`)).body;
    const mark = marks.find((each) => each.number === markNumber);
    if (mark && mark.version >= version) {
      expect(mark.version).toBe(version);
      return mark;
    }
    if (tries > 80) throw new Error(`m${markNumber} is at version ${mark?.version}`);
    await new Promise((done) => setTimeout(done, 100));
  }
}
