import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { BrowserContext, Page } from 'playwright-core';
import { z } from 'zod';

// The rules of WCAG 2.2 A and AA that a machine can look at, and a few of good practice.
const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
const smallestTextPx = 12;

const Violations = z.array(z.object({ rule: z.string(), where: z.string() }));
const LayoutFaults = z.array(z.string());

/** Stops every request that would leave the machine, and says which those were. */
export async function keepOnThisMachine(context: BrowserContext, address: string): Promise<string[]> {
  const astray: string[] = [];
  await context.route(
    (url) => url.protocol.startsWith('http') && url.origin !== new URL(address).origin,
    (route) => {
      astray.push(route.request().url());
      return route.abort();
    },
  );
  return astray;
}

/** Waits until a page has read what it shows: its heading stands, nothing is busy, its pictures and faces are there. */
export async function settled(page: Page): Promise<void> {
  await page.locator('h1').first().waitFor();
  await page.waitForFunction(
    () =>
      document.fonts.status === 'loaded' &&
      !document.querySelector('[aria-busy="true"]') &&
      [...document.images].every((image) => image.complete || image.loading === 'lazy'),
  );
}

/** What axe-core finds that is serious or critical. */
export async function seriousViolations(page: Page) {
  await page.evaluate(axeSource);
  const found: unknown = await page.evaluate(`(async () => {
    const { violations } = await axe.run(document, { resultTypes: ['violations'] });
    return violations
      .filter(({ impact }) => impact === 'serious' || impact === 'critical')
      .flatMap(({ id, nodes }) => nodes.map((node) => ({
        rule: id + (node.any[0] ? ': ' + node.any[0].message : ''),
        where: node.target.join(' ') + ' ' + node.html.slice(0, 160),
      })));
  })()`);
  return Violations.parse(found);
}

/** What any width must keep: no sideways scroll, no text under 12 px, one first heading. */
export async function layoutFaults(page: Page): Promise<string[]> {
  const found: unknown = await page.evaluate((smallest) => {
    const faults: string[] = [];
    const { documentElement: root, body } = document;
    // What stands out at the side is clipped; only without that does it show.
    for (const { style } of [root, body]) style.overflowX = 'visible';
    const { scrollWidth, clientWidth } = root;
    if (scrollWidth > clientWidth) {
      const wide = [...document.querySelectorAll('body *')].filter(
        (each) => each.getBoundingClientRect().right > clientWidth + 1 && !scrollsInside(each),
      );
      const where = wide.slice(0, 3).map((each) => `<${each.tagName.toLowerCase()} class="${each.className}">`);
      faults.push(`scrolls sideways by ${scrollWidth - clientWidth} px: ${where.join(' ')}`);
    }
    for (const { style } of [root, body]) style.removeProperty('overflow-x');
    const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
    while (walker.nextNode()) {
      const text = walker.currentNode.textContent?.trim() ?? '';
      const holder = walker.currentNode.parentElement;
      if (text === '' || !holder || !holder.checkVisibility({ visibilityProperty: true })) continue;
      const size = Number.parseFloat(getComputedStyle(holder).fontSize);
      if (size < smallest) faults.push(`"${text.slice(0, 30)}" is set in ${size} px`);
    }
    const headings = document.querySelectorAll('h1').length;
    if (headings !== 1) faults.push(`${headings} first headings`);
    return faults;

    function scrollsInside(element: Element): boolean {
      for (let at = element.parentElement; at && at !== document.body; at = at.parentElement)
        if (getComputedStyle(at).overflowX !== 'visible') return true;
      return false;
    }
  }, smallestTextPx);
  return LayoutFaults.parse(found);
}
