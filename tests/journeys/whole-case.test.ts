import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { enterMaterial } from '#server/features/materials/service/keep-material.ts';
import { recordConstant } from '#server/features/materials/service/record-constant.ts';
import { drawFractureSurface } from '#server/imaging/synthetic-surface/draw-fracture-surface.ts';
import { encodeFractureSurface } from '#server/imaging/synthetic-surface/encode-fracture-surface.ts';
import type { SurfaceTruth } from '#server/imaging/synthetic-surface/surface-spec.ts';
import type { EstimateView } from '#shared/contracts/estimates.ts';
import { openBrowser, pageOf, visitorPage, type SignedInPage } from '../support/browser.ts';
import { OpenBench } from '../support/on-the-bench.ts';
import { builtPages } from '../support/pages.ts';
import { aLaboratory, startTestServer, testPassword, type TestServer } from '../support/test-server.ts';

// A bar of alumina, 4.01 × 3.00 mm on 40/20 mm spans, broken at 421 N from a pore of 64 µm with a mirror of 560 µm.
const size = { widthPx: 1600, heightPx: 1150 };
const pixelSizeUm = 0.9;
const barLengthUm = 200;

let pages: Awaited<ReturnType<typeof builtPages>>;
let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let browser: Browser;
let folder: string;
let picture: string;
let truth: SurfaceTruth;
let ana: SignedInPage;
let writer: SignedInPage | undefined;
let manager: SignedInPage | undefined;
let number = '';

beforeAll(async () => {
  pages = await builtPages();
  server = await startTestServer({ withoutPages: false, pagesFolder: pages.folder });
  people = await aLaboratory(server);
  await anAlumina();
  folder = await mkdtemp(join(tmpdir(), 'hacklebook-pictures-'));
  picture = join(folder, 'A17_face_A.tif');
  const surface = drawFractureSurface({
    ...size,
    seed: 31,
    pixelSizeUm,
    origin: { xPx: 800, yPx: 1010 },
    originDepthUm: 0,
    flaw: { kind: 'pore', halfAxisDepthUm: 64, halfAxisAlongUm: 64 },
    mirrorRadiusUm: 560,
    scaleBarUm: barLengthUm,
    body: 'fine',
  });
  truth = surface.truth;
  await writeFile(picture, await encodeFractureSurface(surface, 'tiff'));
  browser = await openBrowser();
  ana = await visitorPage(browser, server.address);
}, 240_000);

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  await pages?.drop();
  if (folder) await rm(folder, { recursive: true, force: true });
});

/** Toughness 3.5 ± 0.2 and outer mirror constant 8.5 ± 0.6 MPa√m, ± U at k = 2. */
async function anAlumina(): Promise<void> {
  const { context } = people.engineer;
  const alumina = { name: 'alumina AL-31', family: 'alumina', route: null, grainSizeUm: null, note: null } as const;
  const { id } = await enterMaterial(context, alumina);
  const record = (kind: 'toughness' | 'mirror constant, outer', value: string, plusMinus: string) =>
    recordConstant(context, id, {
      ...{ kind, value, plusMinus, plusMinusIs: 'U', source: 'own lot', sourceStanding: 'own test' },
      ...{ condition: null, validFrom: '2026-01-01', reason: null, replaces: null },
    });
  await record('toughness', '3.5 MPa√m', '0.2');
  await record('mirror constant, outer', '8.5 MPa√m', '0.6');
}

const look = (page: Page, name: string) =>
  process.env.HACKLEBOOK_LOOK
    ? page.screenshot({ path: `${process.env.HACKLEBOOK_LOOK}/${name}.png`, fullPage: true })
    : undefined;

const chapter = (page: Page, name: string) =>
  page
    .getByRole('navigation', { name: /Chapters/ })
    .getByRole('link', { name })
    .click();

async function signIn(page: Page, mail: string): Promise<void> {
  await page.goto('/');
  await page.getByLabel('Mail address').fill(mail);
  await page.getByLabel('Password').fill(testPassword);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { name: 'Casebook', level: 1 }).waitFor();
}

async function move(page: Page, words: RegExp): Promise<void> {
  await page.getByRole('button', { name: 'Acts' }).click();
  await page.getByRole('menuitem', { name: words }).click();
}

/** One input of the estimate's form, by its label. */
const input = (page: Page, label: string) => page.getByRole('group', { name: new RegExp(`^${label}`) });

async function type(page: Page, label: string, value: string, standardUncertainty: string): Promise<void> {
  const group = input(page, label);
  const typed = group.getByRole('radio', { name: 'typed' });
  if (await typed.count()) await typed.check();
  await group.getByLabel(/^Value/).fill(value);
  await group.getByLabel('±, or %').fill(standardUncertainty);
  await group.getByLabel('± is').selectOption('standard');
}

async function takeFromMark(page: Page, label: string, relativePercent: string): Promise<void> {
  const group = input(page, label);
  await group.getByRole('radio', { name: 'from a mark' }).check();
  await group.getByLabel('Mark', { exact: true }).selectOption({ index: 1 });
  await group.getByLabel('Own u, %').fill(relativePercent);
}

async function takeConstant(page: Page, label: string): Promise<void> {
  const group = input(page, label);
  await group.getByRole('radio', { name: 'from the material' }).check();
  await group.getByLabel('Constant on record').selectOption({ index: 1 });
}

/** Sets the caret at the end of the paragraph under a heading of the findings. */
async function under(page: Page, heading: string): Promise<void> {
  await page.locator('.findings-prose h2', { hasText: heading }).locator('xpath=following-sibling::p[1]').click();
  await page.keyboard.press('End');
}

async function estimatesKept(): Promise<EstimateView[]> {
  const { body } = await people.analyst.client.get(`/cases/${number}/estimates`);
  return body.estimates;
}

describe('one broken bar, from its arrival to its seal', () => {
  it('is opened as a case by an analyst who has just signed in', async () => {
    const { page } = ana;
    await signIn(page, people.analyst.mail);
    await look(page, '01-casebook-empty');
    await page.getByRole('link', { name: 'Open a case' }).first().click();
    await page.getByLabel('Part, and what happened').fill('Bend bar A-17: broke in test');
    await page.getByLabel('What happened', { exact: true }).fill('Broke at 421 N between the inner rollers.');
    await page.getByLabel('Kind').selectOption('test specimen');
    await page.getByLabel('Material').selectOption({ label: 'alumina AL-31' });
    await page.getByLabel('Who asks').selectOption({ label: 'Test Maker' });
    await page.getByLabel('What is asked').fill('Where did the bar break from?\nWhat stress did the origin carry?');
    await look(page, '02-open-a-case');
    await page.getByRole('button', { name: 'Open the case' }).click();
    await page.waitForURL(/\/cases\/HB-\d{4}-0001/);
    number = /HB-\d{4}-\d{4}/.exec(page.url())?.[0] ?? '';
    await page.getByText('Where did the bar break from?').waitFor();
    await move(page, /examin/i);
    await page.locator('header, main').getByText('examining').first().waitFor();
    await look(page, '03-intake');
  });

  it('gives its part and pieces their numbers', async () => {
    const { page } = ana;
    await chapter(page, 'Evidence');
    await page.getByRole('button', { name: 'Enter the part' }).click();
    await page.getByLabel('What it is').fill('Bend bar A-17, 3 × 4 × 45 mm');
    await page.getByRole('button', { name: 'Enter the part' }).click();
    await look(page, '04-part');
    await page.getByRole('button', { name: 'Receive a piece' }).click();
    await page.getByLabel('What it is').fill('left half, face A');
    await page.getByLabel('Mass').fill('1.02 g ± 0.01 g');
    await page.getByLabel('Where it is').fill('bench 2');
    await page.getByLabel('With', { exact: true }).fill('Ana Lyst');
    await page
      .getByRole('button', { name: /^Receive/ })
      .last()
      .click();
    await page.getByRole('button', { name: 'Change F1' }).waitFor();
    await look(page, '04-evidence');
  });

  it('shows its fracture surface once the file has been looked through', async () => {
    const { page } = ana;
    await chapter(page, 'Fractographs');
    await look(page, '05-fractographs-empty');
    await page.locator('input[type=file]').first().setInputFiles(picture);
    await page.getByRole('link', { name: 'Open on the bench' }).click({ timeout: 60_000 });
    await new OpenBench(page, size).whole();
    await page.getByText('uncalibrated').first().waitFor();
  });

  it('gets its scale from the bar on the image, read twice', async () => {
    const { page } = ana;
    const bench = new OpenBench(page, size);
    const bar = truth.scaleBar;
    if (!bar) throw new Error('no bar drawn');
    await page.getByRole('button', { name: /scale/i }).first().click();
    await page.getByLabel('Read the bar on the image').check();
    await page.getByRole('button', { name: 'Draw along the bar' }).click();
    const middle = bar.yPx + bar.thicknessPx / 2;
    for (const _reading of [1, 2]) {
      await bench.click({ x: bar.xPx, y: middle });
      await bench.click({ x: bar.xPx + bar.lengthPx, y: middle });
    }
    await page.getByLabel('Length of the scale bar').fill(String(barLengthUm));
    await page.getByRole('button', { name: 'Bind the scale' }).click();
    await page.getByText(/bar of 200 µm read twice/).waitFor();
    const [image] = (await people.analyst.client.get(`/cases/${number}/fractographs`)).body;
    // two clicks fall on whole px of screen, each about 1.6 px of an image whose bar is 222 px long
    expect(Math.abs(image.scale.pixelSizeXUm / pixelSizeUm - 1)).toBeLessThan(0.02);
  });

  it('is marked with origin, flaw and mirror', async () => {
    const { page } = ana;
    const bench = new OpenBench(page, size);
    const origin = { x: truth.origin.xPx, y: truth.origin.yPx };
    const around = (radiusPx: number, degrees: number) => ({
      x: origin.x + radiusPx * Math.cos((degrees * Math.PI) / 180),
      y: origin.y - radiusPx * Math.sin((degrees * Math.PI) / 180),
    });
    await page.locator('[data-face="first"]').focus();
    await page.keyboard.press('o');
    await bench.click(origin);
    await page.getByRole('button', { name: 'm1, Origin' }).waitFor();
    await page.locator('[data-face="first"]').focus();
    await page.keyboard.press('f');
    const flawPx = truth.flaw?.halfAxisDepthPx ?? 0;
    await bench.chain([180, 135, 90, 45, 0].map((degrees) => around(flawPx, degrees)));
    await page.getByRole('button', { name: /m2, Flaw/ }).waitFor();
    await page.locator('[data-face="first"]').focus();
    await page.keyboard.press('m');
    const mirrorPx = truth.mirror?.radiusPx ?? 0;
    await bench.chain([179, 150, 120, 90, 60, 30, 1].map((degrees) => around(mirrorPx, degrees)));
    await page.getByRole('button', { name: /m3, Mirror/ }).waitFor();
    await look(page, '06-bench');
  });

  it('carries a stress at the origin by three lines, each with its interval', async () => {
    const { page } = ana;
    await page.goto(`/cases/${number}/estimates`);
    await page.getByRole('button', { name: 'Estimate by the load' }).click();
    await page.getByLabel('Method').selectOption('bend4.rect');
    await type(page, 'Load', '421 N', '1.73 %');
    await type(page, 'Outer span', '40 mm', '0.1 mm');
    await type(page, 'Inner span', '20 mm', '0.1 mm');
    await type(page, 'Width', '0.15787 in', '0.01 mm');
    await input(page, 'Width').getByText('0.15787 in').waitFor();
    await type(page, 'Depth', '3.00 mm', '0.01 mm');
    await look(page, '07-load-form');
    await page.getByRole('button', { name: 'Keep the load estimate' }).click();
    await page.getByRole('button', { name: 'Estimate by the mirror' }).click();
    await takeFromMark(page, 'Mirror radius', '6');
    await takeConstant(page, 'Mirror constant');
    await page.getByRole('button', { name: 'Keep the mirror estimate' }).click();
    await page.getByRole('button', { name: 'Estimate by the flaw' }).click();
    await takeConstant(page, 'Fracture toughness');
    await type(page, 'Shape factor', '1.29', '6 %');
    await takeFromMark(page, 'Flaw size', '10');
    await page.getByRole('button', { name: 'Keep the flaw estimate' }).click();
    await page.getByText(/agree/i).first().waitFor();
    await look(page, '08-estimates');
    const [load, mirror, flaw] = [await stressOf('load'), await stressOf('mirror'), await stressOf('flaw')];
    // σ = 3F(L − l) / 2bd² = 3 × 421 × 20 / (2 × 4.0099 × 3.00²) MPa
    expect(load).toBeCloseTo((3 * 421 * 20) / (2 * 0.15787 * 25.4 * 9), 6);
    // σ = A/√R with R = 560 µm, and K/(Y√a) with a = 64 µm; the marks are set by hand to a px or two of screen
    expect(Math.abs(mirror / (8.5 / Math.sqrt(560e-6)) - 1)).toBeLessThan(0.015);
    expect(Math.abs(flaw / (3.5 / (1.29 * Math.sqrt(64e-6))) - 1)).toBeLessThan(0.04);
  });

  it('is written up by two people at once, with a figure and the number bound into the text', async () => {
    const { page } = ana;
    await move(page, /draft/i);
    await page.locator('header, main').getByText('drafting').first().waitFor();
    writer = await pageOf(browser, server.address, people.engineer);
    for (const each of [page, writer.page]) {
      await each.goto(`/cases/${number}/findings`);
      await each.locator('.findings-prose h2').first().waitFor();
    }
    await under(page, 'What the surface shows');
    await under(writer.page, 'What to do');
    await Promise.all([
      page.keyboard.type('The break started at a pore cut by the tensile surface. ', { delay: 4 }),
      writer.page.keyboard.type('Nothing; the bar is an ordinary member of its lot. ', { delay: 4 }),
    ]);
    await page.getByText('ordinary member of its lot').waitFor();
    await page.getByRole('button', { name: 'Figure' }).click();
    await page.getByLabel('What is seen').fill('Origin, flaw and mirror on the left half.');
    await page.getByRole('button', { name: 'Place Fig. 1' }).click();
    await page.locator('.findings-figure img').waitFor();
    await under(page, 'Stress at the origin');
    await page.keyboard.type('By load and section the origin carried ');
    await page.keyboard.press('Control+k');
    await page.getByRole('combobox', { name: 'Find a value' }).fill('load origin');
    await page.locator('.bind-preview .bound-value').waitFor();
    await page.keyboard.press('Enter');
    await page.locator('.findings-prose .bound-value').getByText('350').waitFor();
    await Promise.all([page, writer.page].map((each) => each.getByText(/^Kept \d\d:\d\d/).waitFor()));
    await look(page, '09-findings');
  });

  it('goes to review once nothing stands in its way, signed by its author', async () => {
    const { page } = ana;
    await chapter(page, 'Review');
    await page.getByRole('button', { name: `Send ${number} to review` }).waitFor();
    await look(page, '10-toward-review');
    await page.getByRole('button', { name: `Send ${number} to review` }).click();
    await page.getByLabel('Your signature says').selectOption('authored');
    await page.getByLabel('Your password, once more').fill(testPassword);
    await page.getByRole('button', { name: 'Sign as authored' }).click();
    await page.getByRole('rowheader', { name: /^Authored/ }).waitFor();
    await look(page, '11-in-review');
  });

  it('is read by a manager, who accepts its notes with reasons, signs and closes it', async () => {
    manager = await visitorPage(browser, server.address);
    const { page } = manager;
    await signIn(page, people.manager.mail);
    await page.getByRole('link', { name: number }).click();
    await chapter(page, 'Findings');
    await page.getByText('The break started at a pore').waitFor();
    await page.locator('.findings-prose .bound-value').getByText('350').waitFor();
    await chapter(page, 'Review');
    const accept = page.getByRole('button', { name: 'Accept this note' });
    await accept.first().waitFor();
    await look(page, '12-notes');
    const reason = page.getByLabel('Why it may stand');
    while ((await accept.count()) > 0) {
      await accept.first().click();
      await reason.fill('Seen, and no hindrance to the answer.');
      await page.getByRole('button', { name: 'Let the note stand' }).click();
      await reason.waitFor({ state: 'detached' });
    }
    await page.getByLabel('Your signature says').selectOption('approved');
    await page.getByLabel('Your password, once more').fill(testPassword);
    await look(page, '12-before-signing');
    await page.getByRole('button', { name: `Sign and close ${number}` }).click();
    await page.getByText('Every image and record still matches the list').waitFor();
    await look(page, '13-closed');
  });

  it('is frozen from then on', async () => {
    const { page } = ana;
    await page.goto(`/cases/${number}/estimates`);
    await page.getByText(/Closed on .* sealed/).waitFor();
    expect(await page.getByRole('button', { name: /^Estimate by/ }).count()).toBe(0);
    const answer = await people.analyst.client.post(`/cases/${number}/background`, {
      ...{ statement: 'One more thing', standing: 'told', source: 'someone', givenOn: '2026-12-01' },
    });
    expect(answer.body.code).toBe('closed-case');
    await look(page, '14-sealed');
  });

  it('leaves no error in the console of anyone', () => {
    expect([ana, writer, manager].flatMap((each) => each?.complaints ?? ['was never there'])).toEqual([]);
  });
});

async function stressOf(line: string): Promise<number> {
  const found = (await estimatesKept()).find((estimate) => estimate.line === line);
  if (!found) throw new Error(`no estimate by the ${line}`);
  return found.origin.value;
}
