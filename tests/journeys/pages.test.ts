import { mkdirSync } from 'node:fs';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { FractographList } from '#shared/contracts/fractographs.ts';
import { MaterialList } from '#shared/contracts/materials.ts';
import { demoPassword } from '#server/database/demo/people.ts';
import { seedDemo } from '#server/database/seed.ts';
import { visitorContext } from '#server/http/context.ts';
import { openBrowser, signedInPage, visitorPage, type SignedInPage } from '../support/browser.ts';
import { everyPage, readerMails, type PageLooked, type Reader } from '../support/every-page.ts';
import { keepOnThisMachine, layoutFaults, seriousViolations, settled } from '../support/page-checks.ts';
import { builtPages } from '../support/pages.ts';
import { startTestServer, type TestServer } from '../support/test-server.ts';

// The last day of the demo; its images are drawn a quarter as wide.
const today = new Date('2026-10-19T12:00:00Z');
const pixelFactor = 4;
const longestSeedMs = 240_000;
const desk = { width: 1440, height: 900 };
const narrower = [
  { width: 1100, height: 900 },
  // What 200 % of zoom leaves of a desk's screen.
  { width: 720, height: 450 },
  { width: 390, height: 844 },
];
// WCAG 2.2, 1.4.12: what a reader may set over the page's own spacing.
const widerText =
  '* { line-height: 1.5 !important; letter-spacing: 0.12em !important; word-spacing: 0.16em !important; }';

let pages: Awaited<ReturnType<typeof builtPages>>;
let server: TestServer;
let browser: Browser;
let ids: { bench: string; material: string };
const opened = new Map<Reader, SignedInPage & { astray: string[] }>();

beforeAll(async () => {
  pages = await builtPages();
  server = await startTestServer({ withoutPages: false, pagesFolder: pages.folder, clock: () => today });
  await seedDemo(server.parts, visitorContext(server.parts), { pixelFactor });
  browser = await openBrowser();
  ids = await idsOf((await eyesOf('analyst')).page);
}, longestSeedMs);

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  await pages?.drop();
});

/** The browser of a reader, signed in once; nothing of it leaves the machine. */
async function eyesOf(reader: Reader) {
  const known = opened.get(reader);
  if (known) return known;
  const { address } = server;
  const own =
    reader === 'visitor'
      ? await visitorPage(browser, address)
      : await signedInPage(browser, address, { mail: readerMails[reader], password: demoPassword });
  // Colours are looked at as they stand, not on their way from one light to the other.
  await own.page.emulateMedia({ reducedMotion: 'reduce' });
  const eyes = { ...own, astray: await keepOnThisMachine(own.context, address) };
  opened.set(reader, eyes);
  return eyes;
}

async function idsOf(page: Page) {
  const read = async (path: string): Promise<unknown> => (await page.context().request.get(`/api${path}`)).json();
  const [figure] = FractographList.parse(await read('/cases/HB-2026-0004/fractographs'));
  const [material] = MaterialList.parse(await read('/materials'));
  if (!figure || !material) throw new Error('the demo has neither figure nor material');
  return { bench: figure.id, material: material.id };
}

async function open(page: Page, path: string): Promise<void> {
  await page.goto(path.replace(':bench', ids.bench).replace(':material', ids.material));
  await settled(page);
}

async function look(page: Page, name: string): Promise<void> {
  const folder = process.env.HACKLEBOOK_LOOK;
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await page.screenshot({ path: `${folder}/${name}.png`, fullPage: true });
}

/** Charts measure their frame and are drawn again for it; a few frames on they stand. */
async function drawnAnew(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const fewFrames = 3;
    for (let frame = 0; frame < fewFrames; frame += 1) await new Promise(requestAnimationFrame);
  });
}

/** What is wrong with a page in both lights at a desk, and in its layout at every width. */
async function faultsOf(page: Page, { name, path }: PageLooked): Promise<unknown[]> {
  const faults: unknown[] = [];
  await page.setViewportSize(desk);
  await open(page, path);
  for (const light of ['paper', 'bench light']) {
    await page.evaluate((dark) => document.documentElement.classList.toggle('bench-light', dark), light !== 'paper');
    faults.push(...(await seriousViolations(page)).map((each) => ({ light, ...each })));
    await look(page, `${name}-1440-${light}`);
  }
  await page.evaluate(() => document.documentElement.classList.remove('bench-light'));
  for (const size of [desk, ...narrower]) {
    await page.setViewportSize(size);
    await drawnAnew(page);
    faults.push(...(await layoutFaults(page)).map((fault) => `at ${size.width} px: ${fault}`));
    await look(page, `${name}-${size.width}`);
  }
  return faults;
}

describe.each(everyPage)('the page $name, as $reader', (looked) => {
  it('can be read in both lights and at every width, keeps to this machine, and complains of nothing', async () => {
    const { page, complaints, astray } = await eyesOf(looked.reader);
    complaints.length = 0;
    expect(await faultsOf(page, looked)).toEqual([]);
    expect(astray).toEqual([]);
    // The browser itself reports an answer "not found"; the page says it in its own words.
    expect(complaints.filter((each) => !(looked.isMissing && each.includes('404')))).toEqual([]);
  });
});

describe('a page of the book', () => {
  it.each(['/', '/cases/HB-2026-0004/estimates', '/cases/HB-2026-0004/review', '/materials'])(
    'at %s bears wider spacing of its text without scrolling sideways',
    async (path) => {
      const { page } = await eyesOf('analyst');
      await page.setViewportSize(desk);
      await open(page, path);
      await page.evaluate((style) => {
        const sheet = new CSSStyleSheet();
        sheet.replaceSync(style);
        document.adoptedStyleSheets = [...document.adoptedStyleSheets, sheet];
      }, widerText);
      expect(await layoutFaults(page)).toEqual([]);
    },
  );

  it.each([
    ['analyst', '/', 'link', 'Open a case'],
    ['analyst', '/cases/HB-2026-0010/estimates', 'button', 'Estimate by the load'],
    ['second reader', '/cases/HB-2026-0005/fractographs', 'link', 'Open on the bench'],
    ['engineer', '/materials', 'button', 'Enter a material'],
  ] as const)('lets the %s reach the main act of %s by the keyboard alone', async (reader, path, role, name) => {
    const { page } = await eyesOf(reader);
    await page.setViewportSize(desk);
    await open(page, path);
    const act = page.getByRole(role, { name }).first();
    await act.waitFor();
    const mostSteps = 120;
    let isReached = false;
    for (let step = 0; step < mostSteps && !isReached; step += 1) {
      await page.keyboard.press('Tab');
      isReached = await act.evaluate((element) => element === document.activeElement);
    }
    expect(isReached).toBe(true);
    expect(await act.evaluate((element) => getComputedStyle(element).outlineStyle)).toBe('solid');
  });
});
