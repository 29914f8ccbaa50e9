import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { drawFractureSurface } from '#server/imaging/synthetic-surface/draw-fracture-surface.ts';
import { encodeFractureSurface } from '#server/imaging/synthetic-surface/encode-fracture-surface.ts';
import type { FractureSurfaceSpec } from '#server/imaging/synthetic-surface/surface-spec.ts';
import { FindingsFacts } from '#shared/contracts/findings.ts';
import { aCase, aLoadEstimate, markFace } from '../support/a-bar-case.ts';
import { aReadyImage } from '../support/an-image.ts';
import { openBrowser, pageOf, type SignedInPage } from '../support/browser.ts';
import { builtPages } from '../support/pages.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

// The mark builder sets the origin at (1500, 1500); the surface is drawn about that place.
const aSurface: FractureSurfaceSpec = {
  seed: 7,
  widthPx: 2400,
  heightPx: 1700,
  pixelSizeUm: 0.5,
  origin: { xPx: 1500, yPx: 1500 },
  originDepthUm: 0,
  flaw: { kind: 'surface-crack', halfAxisDepthUm: 60, halfAxisAlongUm: 70 },
  mirrorRadiusUm: 250,
  scaleBarUm: 200,
  body: 'fine',
};

let pages: Awaited<ReturnType<typeof builtPages>>;
let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let browser: Browser;
let number: string;
let imageId: string;
let marks: Awaited<ReturnType<typeof markFace>>;
let ana: SignedInPage;
let engineer: SignedInPage;

beforeAll(async () => {
  pages = await builtPages();
  server = await startTestServer({ withoutPages: false, pagesFolder: pages.folder });
  people = await aLaboratory(server);
  browser = await openBrowser();
  number = (await aCase(people)).number;
  const bytes = await encodeFractureSurface(drawFractureSurface(aSurface), 'png');
  imageId = (await aReadyImage(people.analyst, number, bytes, 'face.png')).id;
  const bound = await people.analyst.client.post(`/cases/${number}/fractographs/${imageId}/calibrations`, {
    reading: { way: 'typed', pixelSizeXUm: 0.5, relativeUncertainty: 0.004, source: 'stage scale SM-2', typed: '0.5' },
    bindingSeen: null,
  });
  expect(bound.status, JSON.stringify(bound.body)).toBe(201);
  marks = await markFace(people.analyst, { number, imageId }, { radiusPx: 500, flawPx: 120 });
  expect((await people.analyst.client.post(`/cases/${number}/estimates`, aLoadEstimate())).status).toBe(201);
  ana = await pageOf(browser, server.address, people.analyst);
  engineer = await pageOf(browser, server.address, people.engineer);
}, 180_000);

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  await pages?.drop();
});

const look = (page: Page, name: string) =>
  process.env.HACKLEBOOK_LOOK
    ? page.screenshot({ path: `${process.env.HACKLEBOOK_LOOK}/${name}.png`, fullPage: true })
    : undefined;

async function open({ page }: SignedInPage): Promise<Page> {
  page.setDefaultTimeout(12_000);
  await page.goto(`/cases/${number}/findings`);
  await page.locator('.findings-prose h2').first().waitFor();
  return page;
}

/** Sets the caret at the end of the paragraph under that heading. */
async function under(page: Page, heading: string): Promise<void> {
  await page.locator('.findings-prose h2', { hasText: heading }).locator('xpath=following-sibling::p[1]').click();
  await page.keyboard.press('End');
}

const kept = (page: Page) => page.getByText(/^Kept \d\d:\d\d/).waitFor();

const factsNow = async () =>
  FindingsFacts.parse((await people.analyst.client.get(`/cases/${number}/findings/facts`)).body);

describe('the findings on two pages at once', () => {
  it('show both what each types, who is there, and say that it is kept', async () => {
    const [one, two] = [await open(ana), await open(engineer)];
    await under(one, 'What the surface shows');
    await under(two, 'What to do');
    await Promise.all([
      one.keyboard.type('The break started at the tensile edge. ', { delay: 5 }),
      two.keyboard.type('Grind the others along. ', { delay: 5 }),
    ]);
    await one.getByText('Grind the others along.').waitFor();
    await two.getByText('The break started at the tensile edge.').waitFor();
    await Promise.all([kept(one), kept(two)]);
    await one.getByText('Lab, writing in 7').waitFor();
    await two.getByText('Ana, writing in 3').waitFor();
    await one.locator('.findings-caret-name', { hasText: 'Lab' }).waitFor();
    expect((await factsNow()).text).toContain('The break started at the tensile edge. ');
    await look(one, 'findings-two-writers');
  });

  it('bind a value with the keyboard alone, as it was said to read', async () => {
    const page = ana.page;
    await under(page, 'Stress at the origin');
    await page.keyboard.type('The load line gives ');
    await page.keyboard.press('Control+k');
    await page.getByRole('combobox', { name: 'Find a value' }).fill('load origin');
    const preview = page.locator('.bind-preview .bound-value');
    await preview.waitFor();
    await look(page, 'findings-bind');
    const said = (await preview.innerText()).replaceAll('\u00A0', ' ');
    await page.keyboard.press('Enter');
    const value = page.locator('.findings-prose .bound-value');
    await value.waitFor();
    expect((await value.innerText()).replaceAll('\u00A0', ' ')).toBe(said);
    expect(said).toBe('350 ± 14 MPa');
    await page.keyboard.type(' and the mirror reaches ');
    await page.keyboard.press('Control+k');
    await page.getByRole('combobox', { name: 'Find a value' }).fill('mirror radius');
    await page.getByRole('button', { name: /^Bind 250/ }).click();
    await page.locator('.findings-prose .bound-value').nth(1).waitFor();
    await page.keyboard.type(' from the origin. Nothing else broke.');
    await engineer.page.locator('.findings-prose .bound-value').nth(1).waitFor();
    await kept(page);
  });

  it('place a figure with its marks, seen by both', async () => {
    const page = ana.page;
    await under(page, 'What the surface shows');
    await page.getByRole('button', { name: 'Figure' }).click();
    await page.getByLabel('What is seen').fill('Origin and mirror on the first face.');
    await look(page, 'findings-figure-dialog');
    await page.getByRole('button', { name: 'Place Fig. 1' }).click();
    for (const each of [page, engineer.page]) {
      const image = each.locator('.findings-figure img');
      await image.waitFor();
      await expect
        .poll(() => image.evaluate((node: HTMLImageElement) => node.naturalWidth), { timeout: 20_000 })
        .toBe(400);
    }
    await kept(page);
    expect(await factsNow()).toMatchObject({ figures: 1, unresolved: 0, staleBoundValues: [] });
  });

  it('say at the line what went stale when a mark is moved elsewhere, and take the new value', async () => {
    const page = ana.page;
    const moved = await people.secondAnalyst.client.patch(
      `/cases/${number}/fractographs/${imageId}/marks/${marks.mirror}`,
      {
        versionSeen: 1,
        geometry: {
          shape: 'chain',
          points: [
            { x: 920, y: 1500 },
            { x: 2080, y: 1500 },
          ],
        },
      },
    );
    expect(moved.status).toBe(200);
    await page.locator('.findings-prose .bound-value.is-stale').waitFor();
    await page.locator('.findings-notes').getByText('It would read').waitFor();
    await page.locator('.stale-sentence').first().waitFor();
    await page.setViewportSize({ width: 1440, height: 900 });
    await look(page, 'findings-stale-1440');
    await page.setViewportSize({ width: 1100, height: 900 });
    await look(page, 'findings-stale-1100');
    await page.setViewportSize({ width: 390, height: 844 });
    await look(page, 'findings-stale-390');
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390);
    await page.setViewportSize({ width: 1440, height: 900 });
    await page.getByRole('button', { name: 'Take the new value' }).click();
    await page.getByRole('button', { name: 'Draw again' }).click();
    await expect
      .poll(() => page.locator('.findings-prose :is(.is-stale, .margin-note)').count(), { timeout: 15_000 })
      .toBe(0);
    await engineer.page.locator('.findings-prose').getByText('290').waitFor();
    await kept(page);
    expect(await factsNow()).toMatchObject({ figures: 1, unresolved: 0, staleBoundValues: [] });
    await look(page, 'findings-settled');
  });

  it('keep what is typed without a connection, say so, and send it once there is one', async () => {
    let isCut = false;
    const cuts: (() => Promise<void>)[] = [];
    await ana.page.routeWebSocket(/sockets\/findings/, (socket) => {
      if (isCut) return void socket.close();
      socket.connectToServer();
      cuts.push(() => socket.close());
    });
    const page = await open(ana);
    await under(page, 'What was asked');
    isCut = true;
    await Promise.all(cuts.map((cut) => cut()));
    await page.keyboard.type('Why did it break? ');
    await page.getByText('Not kept yet: no connection').waitFor();
    expect((await factsNow()).text).not.toContain('Why did it break?');
    isCut = false;
    await kept(page);
    expect((await factsNow()).text).toContain('Why did it break?');
    await engineer.page.locator('.findings-prose').getByText('Why did it break?').waitFor();
  });

  it('are only read by the manager', async () => {
    const manager = await pageOf(browser, server.address, people.manager);
    const page = await open(manager);
    await page.getByText('The break started at the tensile edge.').waitFor();
    expect(await page.locator('.findings-prose').getAttribute('contenteditable')).toBe('false');
    expect(await page.getByRole('toolbar').count()).toBe(0);
    await page.getByText('Only an analyst or an engineer may write in the findings.').waitFor();
    await look(page, 'findings-manager');
    expect(manager.complaints).toEqual([]);
  });

  it('leave no error in the console of either page', () => {
    expect([...ana.complaints, ...engineer.complaints]).toEqual([]);
  });
});
